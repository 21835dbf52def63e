import { shipAddressErrors, type AddressTyping } from './ship-address'

import type { FormError } from '@/components/ui/error-summary'
import type { ShownListing } from '@/shared/contracts/listings'
import type { ShipDayOffer } from '@/shared/contracts/shipments'
import { shippingOf } from '@/shared/domain/listings/shipping-of'
import { statesServed } from '@/shared/domain/listings/states-served'
import { mostOrderCents } from '@/shared/domain/money/most-order-cents'
import { quoteOrder } from '@/shared/domain/money/quote-order'
import { landedCentsEach } from '@/shared/domain/pricing/landed-cost'
import { boxCharges } from '@/shared/domain/shipping/box-charges'
import { parseCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

export type Way = 'collect' | 'ship'

export interface ReservationDraft {
  quantityText: string
  way: Way
  windowId: string
  shipDay: string
  address: AddressTyping
  payMode: 'deposit' | 'full'
  ticked: readonly string[]
  hasPlace: boolean
  /** Days that may be chosen: those offered as safe. null: not known yet. */
  offered: readonly ShipDayOffer[] | null
}

/** A listing's fee is the platform's affair and not part of what a buyer pays: it never changes the quote's total. */
const NO_FEE_BP = 0

/** Shipping is offered where the seller ships to the buyer's state and no rule hides it there. */
export const isShippedHere = ({ body, shipped }: Pick<ShownListing, 'body' | 'shipped'>) =>
  shippingOf(body) !== null && shipped?.isServed === true

/** What the buyer pays for a count, by the same functions that the server charges with. */
export function quoteCount({ body }: Pick<ShownListing, 'body'>, quantity: number, way: Way) {
  const { tiers, depositPct } = body
  const shipping = shippingOf(body)
  const charges = way === 'ship' && shipping ? boxCharges(quantity, shipping) : null
  const totals = quoteOrder({
    tiers,
    quantity,
    boxCents: charges?.boxCents ?? 0,
    freightCents: charges?.freightCents ?? 0,
    taxCents: 0,
    depositBp: depositPct * 100,
    feeBp: NO_FEE_BP,
  })
  return {
    quantity,
    boxes: charges?.boxes ?? 0,
    ...totals,
    /** Everything paid, shared among the animals. */
    landedCents: landedCentsEach(totals.totalCents, quantity) ?? totals.unitCents,
  }
}
export type Quote = ReturnType<typeof quoteCount>

/** The same for what is typed. null: not a whole number, or below the smallest order. */
export function quoteReservation(
  listing: Pick<ShownListing, 'body'>,
  quantityText: string,
  way: Way = 'collect',
): Quote | null {
  const quantity = parseCount(quantityText)
  return quantity === null || quantity < listing.body.minOrder ? null : quoteCount(listing, quantity, way)
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
  else if ((quoteReservation(listing, draft.quantityText, draft.way)?.totalCents ?? 0) > mostOrderCents)
    wrong('quantity', `One order may come to at most ${printCents(mostOrderCents)}. Ask for fewer.`)
  else if (quantity > listing.free) wrong('quantity', `Only ${listing.free} are left.`)
  errors.push(...(draft.way === 'ship' ? shipErrors(listing, draft) : collectErrors(listing, draft)))
  for (const tick of listing.gate?.ticks ?? []) {
    if (!draft.ticked.includes(tick.id)) wrong(`tick-${tick.id}`, 'Please read and tick this statement.')
  }
  return errors
}

function collectErrors(listing: ShownListing, draft: ReservationDraft): FormError[] {
  const errors: FormError[] = []
  if (!draft.hasPlace)
    errors.push({ fieldId: 'place', message: 'Where will the animals live? A ZIP code or a town.' })
  if (listing.windows.length > 0 && draft.windowId === '')
    errors.push({ fieldId: 'window', message: 'Choose a pickup time.' })
  return errors
}

function shipErrors(listing: ShownListing, draft: ReservationDraft): FormError[] {
  const errors = shipAddressErrors(draft.address)
  const isZipGood = !errors.some(({ fieldId }) => fieldId === 'ship-zip')
  if (isZipGood && listing.shipped && !isShippedHere(listing))
    errors.push({ fieldId: 'ship-zip', message: notServedWords(listing) })
  const chosen = draft.offered?.find(({ shipDay }) => shipDay === draft.shipDay)
  if (chosen?.verdict !== 'safe')
    errors.push({ fieldId: 'ship-day', message: 'Choose a day on which the animals arrive well.' })
  return errors
}

export function notServedWords({ body, gate }: Pick<ShownListing, 'body' | 'gate'>): string {
  const where = gate ? ` to ${gate.buyerState}` : ' there'
  return `It is not shipped${where}. The seller ships to ${statesServed(body)?.join(', ') ?? 'nobody'}.`
}
