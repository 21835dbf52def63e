import { now } from '@/server/clock'
import { balancesOf, type LedgerAccount } from '@/server/money/ledger-store'
import { listPaymentsOf, type PaymentRow } from '@/server/money/payment-store'
import { describeListing } from '@/server/listings/describe-listing'
import { listHoldsOf, type HoldRow } from '@/server/orders/hold-store'
import { freeCancelUntil } from '@/server/orders/free-cancel-until'
import { actsOf, mayMeet, maySeeCode, type Party } from '@/server/orders/order-policy'
import { listEventsOf, readEvidence, type OrderEventRow, type OrderRow } from '@/server/orders/order-store'
import type { OrderSeen } from '@/server/orders/party-of'
import {
  readListingIds,
  readPeople,
  readPlaceKinds,
  readWindowIds,
  readSellers,
  type SellerRow,
} from '@/server/orders/party-store'
import { presentHold, presentShipment } from '@/server/orders/present-shipment'
import { listShipmentsOf, type ShipmentRow } from '@/server/orders/shipment-store'
import { presentRating, presentSurvival } from '@/server/ratings/present-rating'
import type { AfterHandOver } from '@/server/ratings/rating-policy'
import { listRatingsOf } from '@/server/ratings/rating-store'
import { listSurvivalOf } from '@/server/ratings/survival-store'
import { paidUnitCents } from '@/server/orders/paid-unit'
import { promiseWords } from '@/server/orders/promise-words'
import { readTermsOf } from '@/server/orders/terms-store'
import { listLatestChecks } from '@/server/shipping/route-check-store'
import type { RouteCheckRow } from '@/server/weather/weather-store'
import type { ListingBody } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'
import type { ShownOrder } from '@/shared/contracts/orders'

interface OrderFacts {
  terms: ListingBody
  seller: SellerRow
  buyerName: string
  listingId: string
  events: OrderEventRow[]
  payments: PaymentRow[]
  balances: Partial<Record<LedgerAccount, number>>
  gate?: GateVerdict
  after: AfterHandOver
  placeKind?: string
  shipment: ShipmentRow | undefined
  check: RouteCheckRow | undefined
  hold: HoldRow | undefined
  /** Of a pickup window that the hold proposes. */
  holdWindowId: string | undefined
}

const idsOf = <T>(values: (T | null)[]) => [...new Set(values.filter((value): value is T => value !== null))]

/** Where the order's cents are now, as the strip shows them. */
function strip(order: OrderRow, facts: OrderFacts): ShownOrder['money']['strip'] {
  const { held = 0, seller_payable: payable = 0, seller_connected: connected = 0 } = facts.balances
  return {
    depositCents: order.firstChargeCents,
    balanceCents: order.balanceCents,
    heldCents: Math.max(0, held),
    releasedCents: Math.max(0, payable + connected),
    refundedCents: order.refundedCents,
  }
}

function slotOf(order: OrderRow, placeKind: string | undefined): ShownOrder['slot'] {
  if (!order.slotStartsAt || !order.slotEndsAt) return undefined
  return {
    startsAt: order.slotStartsAt.toISOString(),
    endsAt: order.slotEndsAt.toISOString(),
    zone: order.zone,
    placeKind: placeKind ?? 'farm-gate',
  }
}

function moneyOf(order: OrderRow, facts: OrderFacts): ShownOrder['money'] {
  const { goodsCents, boxCents, freightCents, taxCents, totalCents, depositCents } = order
  const { firstChargeCents, balanceCents, feeCents, refundedCents } = order
  return {
    ...{ goodsCents, boxCents, freightCents, taxCents, totalCents, depositCents },
    ...{ firstChargeCents, balanceCents, feeCents, refundedCents },
    strip: strip(order, facts),
  }
}

/** The payment page that is open now, for the buyer alone. */
function payUrlOf(order: OrderRow, party: Party, payments: PaymentRow[]): string | undefined {
  if (party !== 'buyer') return undefined
  const purpose = order.state === 'reserved' ? 'deposit' : 'balance'
  return payments.findLast((one) => one.purpose === purpose && one.status === 'open')?.payUrl ?? undefined
}

function freedom(order: OrderRow, terms: ListingBody): Pick<ShownOrder, 'freeCancelUntil'> {
  const until = freeCancelUntil(order, terms)
  return until ? { freeCancelUntil: until.toISOString() } : {}
}

function afterwards({ after, buyerName }: OrderFacts): Pick<ShownOrder, 'rating' | 'survival'> {
  return {
    ...(after.rating ? { rating: presentRating(after.rating, buyerName) } : {}),
    ...(after.survival ? { survival: presentSurvival(after.survival) } : {}),
  }
}

function onItsWay(seen: OrderSeen, facts: OrderFacts): Pick<ShownOrder, 'shipment' | 'hold'> {
  const { shipment, check, gate, hold, holdWindowId } = facts
  return {
    ...(shipment ? { shipment: presentShipment(seen, { shipment, check, gate }) } : {}),
    ...(hold ? { hold: presentHold(hold, holdWindowId) } : {}),
  }
}

function presentOrder(seen: OrderSeen, facts: OrderFacts): ShownOrder {
  const { order, party } = seen
  const { terms, seller } = facts
  const described = describeListing(terms)
  const { street, city, state, zip, phone } = seller
  return {
    orderId: order.publicId,
    party,
    state: order.state as ShownOrder['state'],
    ...(order.reason ? { reason: order.reason as ShownOrder['reason'] } : {}),
    listingId: facts.listingId,
    title: described.title,
    photo: described.photo,
    quantity: order.quantity,
    unitCents: Math.round(paidUnitCents(order)),
    money: moneyOf(order, facts),
    payMode: order.payMode === 'full' ? 'full' : 'deposit',
    balanceDue: order.balanceDue === 'before' ? 'before' : 'at-handover',
    balancePaid: order.balanceCents === 0 || order.balancePaidAt !== null,
    needsAcceptance: order.needsAcceptance,
    handOver: order.handOver === 'ship' ? 'ship' : 'pickup',
    accepting: order.state === 'requested' && order.acceptedAt !== null,
    slot: slotOf(order, facts.placeKind),
    otherParty:
      party === 'seller' ? { name: facts.buyerName } : { name: seller.farmName, sellerId: seller.publicId },
    ...(mayMeet(order, party) ? { meeting: { street, city, state, zip, phone } } : {}),
    ...(maySeeCode(order, party) ? { handOverCode: order.handOverCode } : {}),
    ...(order.countHandedOver === null ? {} : { countHandedOver: order.countHandedOver }),
    ...onItsWay(seen, facts),
    ...afterwards(facts),
    arrivalPromise: promiseWords(terms),
    // What staff decide waits for them alone: no time ends it by itself.
    ...(order.clockAt && order.clockEdge && order.state !== 'claim_open'
      ? { clock: { at: order.clockAt.toISOString(), edge: order.clockEdge } }
      : {}),
    ...freedom(order, facts.terms),
    ...(order.noShowBy && order.noShowAt
      ? {
          noShow: {
            by: order.noShowBy === 'buyer' ? 'buyer' : 'seller',
            contestUntil: (order.clockAt ?? order.noShowAt).toISOString(),
          },
        }
      : {}),
    events: facts.events.map((event) => ({
      edge: event.edge,
      to: event.toState as ShownOrder['state'],
      actor: event.actor,
      at: event.at.toISOString(),
    })),
    gate: facts.gate,
    payUrl: payUrlOf(order, party, facts.payments),
    asOf: now().toISOString(),
    may: actsOf(order, party, facts.after),
  }
}

/** Orders as their viewers may see them; one query a table however many orders there are. */
export async function presentOrders(seen: OrderSeen[]): Promise<ShownOrder[]> {
  const rows = seen.map(({ order }) => order)
  const ids = rows.map((order) => order.id)
  const [
    terms,
    sellers,
    people,
    listings,
    events,
    payments,
    balances,
    evidence,
    placeKinds,
    ratings,
    survivals,
    shipments,
    checks,
    holds,
  ] = await Promise.all([
    readTermsOf(idsOf(rows.map((order) => order.listingVersionId))),
    readSellers(idsOf(rows.map((order) => order.sellerId))),
    readPeople(idsOf(rows.map((order) => order.buyerId))),
    readListingIds(idsOf(rows.map((order) => order.listingId))),
    listEventsOf(ids),
    listPaymentsOf(ids),
    balancesOf(ids),
    readEvidence(ids),
    readPlaceKinds(idsOf(rows.map((order) => order.windowId))),
    listRatingsOf(ids),
    listSurvivalOf(ids),
    listShipmentsOf(ids),
    listLatestChecks(ids),
    listHoldsOf(ids),
  ])
  const windowIds = await readWindowIds(idsOf(holds.map((hold) => hold.proposedWindowId)))
  return seen.flatMap((one) => {
    const { order } = one
    const body = terms.get(order.listingVersionId)
    const seller = sellers.get(order.sellerId)
    if (!body || !seller) return []
    const hold = holds.findLast((row) => row.orderId === order.id)
    return [
      presentOrder(one, {
        terms: body,
        seller,
        buyerName: people.get(order.buyerId)?.name ?? 'A member who left',
        listingId: listings.get(order.listingId) ?? '',
        events: events.filter((event) => event.orderId === order.id),
        payments: payments.filter((payment) => payment.orderId === order.id),
        balances: balances.get(order.id) ?? {},
        gate: evidence.find((row) => row.orderId === order.id && row.party === 'buyer')?.shown.verdict,
        after: {
          rating: ratings.find((row) => row.orderId === order.id),
          survival: survivals.find((row) => row.orderId === order.id),
        },
        placeKind: order.windowId === null ? undefined : placeKinds.get(order.windowId),
        shipment: shipments.find((row) => row.orderId === order.id),
        check: checks.find((row) => row.orderId === order.id),
        hold,
        holdWindowId: windowIds.get(hold?.proposedWindowId ?? 0),
      }),
    ]
  })
}
