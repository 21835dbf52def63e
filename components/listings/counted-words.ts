import type { SupplyBody } from '@/components/supplies/supply-body'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { unitCount, unitNoun } from '@/shared/domain/listings/unit-words'
import { printCount } from '@/shared/units/count'

// The id says it, so that the table of worms need not load for a word.
const manyOf = (taxonId: string) => (taxonId.endsWith('_larvae') ? 'larvae' : 'worms')

/** '60', '3 heads', '2 bags of 50 L (1.8 cu ft)': how many of a listing, with what one of them is. */
export function countedWords(body: FishBody | SupplyBody, count: number): string {
  if (body.category === 'fish') return printCount(count)
  return unitCount(body.saleUnit, count, body.category === 'worms' ? manyOf(body.taxonId) : undefined)
}

/** What is counted, behind a figure of its own: 'heads', 'bags'. '': fish are counted by the figure alone. */
export function countedNoun(body: FishBody | SupplyBody, count: number): string {
  return body.category === 'fish' ? '' : unitNoun(body.saleUnit, count)
}
