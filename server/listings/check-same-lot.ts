import type { FieldProblem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'

const unitOf = (body: ListingBody) => (body.category === 'fish' ? '' : JSON.stringify(body.saleUnit))

/** The stock of a listing on sale counts its units, and orders count them too: another unit is another listing. */
export function checkSameLot(body: ListingBody, onSale: ListingBody | null): FieldProblem[] {
  if (!onSale) return []
  if (onSale.category !== body.category) {
    const detail = 'This listing is on sale as something else: begin a new one.'
    return [{ detail, pointer: '#/draft/category' }]
  }
  if (unitOf(onSale) === unitOf(body)) return []
  const detail =
    'It is on sale by another unit, and orders count that one: begin a new listing for this unit.'
  return [{ detail, pointer: '#/draft/saleUnit' }]
}
