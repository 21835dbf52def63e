import type { Letter, LetterBlock } from '@/server/mail/letter'
import { describeListing } from '@/server/listings/describe-listing'
import type { Agreement } from '@/server/orders/slot-agreement'
import type { OrderRow } from '@/server/orders/order-store'
import type { SellerRow } from '@/server/orders/party-store'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import type { ListingBody } from '@/shared/contracts/listings'
import { countWords, thingsOf } from '@/shared/domain/listings/count-words'
import { lotSize } from '@/shared/domain/listings/lot-size'
import { printSaleUnit } from '@/shared/domain/listings/sale-unit'
import { printSlot } from '@/shared/times/print-time'
import { printLengthRange } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'

export interface Person {
  memberId: string
  name: string
  email: string
}

/** A mail to a party of the order: it goes with a notice, so it names the member. */
export type OrderLetter = Letter & { to: Person }

/** Everything a mail about an order may speak of. */
export interface LetterFacts {
  order: OrderRow
  terms: ListingBody
  seller: SellerRow
  buyer: Person
  sellerPerson: Person
  origin: string
  /** The pickup time as it was agreed on; null while none was. */
  agreement: Agreement | null
  /** null: it is collected. */
  shipment: ShipmentRow | null
}

export function orderUrl({ origin, order }: LetterFacts): string {
  return `${origin}/orders/${order.publicId}`
}

/** The length of animals; of everything else what one unit is. */
function sizeText(terms: ListingBody): string {
  const size = lotSize(terms)
  if (size) return printLengthRange({ minCm: size.loMm / 10, maxCm: size.hiMm / 10 }, 'us')
  return terms.category === 'fish' ? '' : printSaleUnit(terms.saleUnit, thingsOf(terms))
}

/** The tag of the order, as on every page. */
export function orderTag({ order, terms, seller }: LetterFacts): LetterBlock {
  const described = describeListing(terms)
  return {
    kind: 'tag',
    title: described.title,
    size: sizeText(terms),
    count: countWords(terms, order.quantity),
    price: printCents(order.totalCents),
    place: `${seller.farmName}, ${seller.city}, ${seller.state}`,
  }
}

export function slotText({ order }: LetterFacts): string {
  if (!order.slotStartsAt || !order.slotEndsAt) return 'not chosen yet'
  return printSlot({
    startsAt: order.slotStartsAt.toISOString(),
    endsAt: order.slotEndsAt.toISOString(),
    zone: order.zone,
  })
}
