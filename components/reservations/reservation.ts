import type { FormError } from '@/components/ui/error-summary'
import type { ShownListing } from '@/shared/contracts/listings'
import { mostOrderCents } from '@/shared/domain/money/most-order-cents'
import { quoteOrder } from '@/shared/domain/money/quote-order'
import { parseCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

export interface ReservationDraft {
  quantityText: string
  windowId: string
  payMode: 'deposit' | 'full'
  ticked: readonly string[]
  hasPlace: boolean
}

/** A listing's fee is the platform's affair and not part of what a buyer pays: it never changes the quote's total. */
const NO_FEE_BP = 0

/** What the buyer pays, by the same function that the server charges with. null: not a whole number. */
export function quoteReservation(listing: ShownListing, quantityText: string) {
  const quantity = parseCount(quantityText)
  if (quantity === null || quantity < listing.body.minOrder) return null
  const { tiers, depositPct } = listing.body
  const depositBp = depositPct * 100
  return {
    quantity,
    ...quoteOrder({
      tiers,
      quantity,
      boxCents: 0,
      freightCents: 0,
      taxCents: 0,
      depositBp,
      feeBp: NO_FEE_BP,
    }),
  }
}

/** What is missing before the form may be sent; the server checks the same and more. */
export function reservationErrors(listing: ShownListing, draft: ReservationDraft): FormError[] {
  const errors: FormError[] = []
  const { minOrder, orderStep, mostPerBuyer } = listing.body
  const quantity = parseCount(draft.quantityText)
  const wrong = (fieldId: string, message: string) => errors.push({ fieldId, message })
  if (quantity === null || quantity < 1) wrong('quantity', 'How many? A whole number.')
  else if (quantity < minOrder) wrong('quantity', `The smallest order here is ${minOrder}.`)
  else if ((quantity - minOrder) % orderStep !== 0)
    wrong('quantity', `From ${minOrder} on in steps of ${orderStep}.`)
  else if (mostPerBuyer !== undefined && quantity > mostPerBuyer)
    wrong('quantity', `At most ${mostPerBuyer} for one buyer.`)
  else if ((quoteReservation(listing, draft.quantityText)?.totalCents ?? 0) > mostOrderCents)
    wrong('quantity', `One order may come to at most ${printCents(mostOrderCents)}. Ask for fewer.`)
  else if (quantity > listing.free) wrong('quantity', `Only ${listing.free} are left.`)
  if (!draft.hasPlace) wrong('place', 'Where will the animals live? A ZIP code or a town.')
  if (listing.windows.length > 0 && draft.windowId === '') wrong('window', 'Choose a pickup time.')
  for (const tick of listing.gate?.ticks ?? []) {
    if (!draft.ticked.includes(tick.id)) wrong(`tick-${tick.id}`, 'Please read and tick this statement.')
  }
  return errors
}
