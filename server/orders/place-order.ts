import { randomInt } from 'node:crypto'

import { inTransaction, type Tx } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { insertPayment } from '@/server/money/payment-store'
import { newPublicId } from '@/server/new-public-id'
import type { CheckedReservation } from '@/server/orders/check-reservation'
import { orderSettings } from '@/server/orders/order-settings'
import {
  countBought,
  countNoShows,
  countUnpaidHolds,
  findWindow,
  hasOpenWindow,
  holdFish,
  holdSlot,
  insertOrder,
  readFree,
  writeEvent,
  writeEvidence,
} from '@/server/orders/order-store'
import type { ReserveAsked } from '@/server/orders/reserve-batch'
import { shortOf } from '@/server/orders/short-of'
import { noteStock } from '@/server/orders/stock-store'
import type { FoundPlace } from '@/server/places/find-place'
import { projectListings } from '@/server/search/project-listings'
import type { ReservedShipment } from '@/server/shipping/plan-reserved'
import { writeReserved } from '@/server/shipping/write-reserved'
import { Problem } from '@/shared/api/problem'
import type { GateVerdict } from '@/shared/contracts/rules'
import { quoteOrder } from '@/shared/domain/money/quote-order'
import { mayPayInFull } from '@/shared/domain/orders/pay-in-full'
import { clockMs } from '@/shared/domain/orders/clocks.facts'

/** Who has let three pickups pass in sixty days holds for a shorter time and pays everything at once. House rules. */
const FORGETFUL = { noShows: 3, days: 60, holdMinutes: 5 } as const
const DAY_MS = 86_400_000
const MINUTE_MS = 60_000

/** Unpaid holds one member may have at a time: a hold costs the seller sales. House rule. */
const MOST_UNPAID_HOLDS = 3

interface Placing extends CheckedReservation {
  caller: Caller
  asked: ReserveAsked
  place: FoundPlace
  verdict: GateVerdict
  /** null: it is collected. */
  shipped: ReservedShipment | null
  at: Date
}

interface Slot {
  windowId: number | null
  slotStartsAt: Date | null
  slotEndsAt: Date | null
  zone: string
}

/** The ship day, or one place in the window asked for; where windows are published, one must be chosen. */
async function takeSlot(tx: Tx, placing: Placing): Promise<Slot> {
  const { listing, asked, at, shipped, seller } = placing
  if (shipped) return { windowId: null, ...shipped.slot, zone: seller.zone }
  if (!asked.windowId) {
    if (!(await hasOpenWindow(tx, listing.id, at)))
      return { windowId: null, slotStartsAt: null, slotEndsAt: null, zone: seller.zone }
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'Choose a pickup time.', pointer: '#/windowId' }],
    })
  }
  const window = await findWindow(tx, listing.id, asked.windowId)
  if (!window || window.startsAt <= at) {
    throw new Problem('slot-full', 'That pickup time is no longer offered. Choose another.')
  }
  if (!(await holdSlot(tx, window.id))) {
    throw new Problem('slot-full', 'Somebody took the last place in that pickup time. Choose another.')
  }
  const { id, startsAt, endsAt, zone } = window
  return { windowId: id, slotStartsAt: startsAt, slotEndsAt: endsAt, zone }
}

/**
 * The fish first: the update waits for the batch's row before this transaction has looked at anything. Had it read
 * before, each wait would end in a snapshot conflict, and a rush would run its transactions over and over.
 */
async function takeFish(tx: Tx, placing: Placing): Promise<void> {
  const { listing, asked, caller, terms } = placing
  const held = await holdFish(tx, listing.id, asked.quantity)
  if ((await countUnpaidHolds(tx, caller.memberId)) >= MOST_UNPAID_HOLDS) {
    throw new Problem(
      'holds-too-many',
      'Pay or leave one of your open holds first; each ends by itself after 15 minutes.',
    )
  }
  if (terms.mostPerBuyer !== undefined) {
    const bought = await countBought(tx, caller.memberId, listing.id)
    if (bought + asked.quantity > terms.mostPerBuyer) {
      throw new Problem(
        'batch-short',
        `At most ${terms.mostPerBuyer} for one buyer; you already have ${bought}.`,
      )
    }
  }
  if (!held) throw shortOf(await readFree(listing.id, tx))
}

function priced(placing: Placing, slot: Slot, forgetful: boolean) {
  const { terms, asked, at, shipped } = placing
  const { feeBp } = orderSettings()
  const quote = quoteOrder({
    tiers: terms.tiers,
    quantity: asked.quantity,
    boxCents: shipped?.charges.boxCents ?? 0,
    freightCents: shipped?.charges.freightCents ?? 0,
    taxCents: 0,
    depositBp: terms.depositPct * 100,
    feeBp,
  })
  const isFull =
    forgetful ||
    (asked.payMode === 'full' &&
      mayPayInFull({
        totalCents: quote.totalCents,
        nowMs: at.getTime(),
        slotStartMs: slot.slotStartsAt?.getTime() ?? null,
      }))
  const firstChargeCents = isFull ? quote.totalCents : quote.depositCents
  return {
    goodsCents: quote.goodsCents,
    boxCents: quote.boxCents,
    freightCents: quote.freightCents,
    taxCents: quote.taxCents,
    totalCents: quote.totalCents,
    depositCents: quote.depositCents,
    feeCents: quote.feeCents,
    feeBp,
    payMode: firstChargeCents === quote.totalCents ? 'full' : 'deposit',
    firstChargeCents,
    balanceCents: quote.totalCents - firstChargeCents,
  }
}

async function isForgetful(tx: Tx, { caller, at }: Pick<Placing, 'caller' | 'at'>): Promise<boolean> {
  const since = new Date(at.getTime() - FORGETFUL.days * DAY_MS)
  return (await countNoShows(tx, caller.memberId, since)) >= FORGETFUL.noShows
}

async function write(tx: Tx, placing: Placing): Promise<number> {
  const { listing, seller, caller, asked, place, verdict, terms, versionId, shipped, at } = placing
  await takeFish(tx, placing)
  const slot = await takeSlot(tx, placing)
  const forgetful = await isForgetful(tx, placing)
  const money = priced(placing, slot, forgetful)
  const orderId = await insertOrder(tx, {
    publicId: newPublicId(),
    buyerId: caller.memberId,
    sellerId: seller.id,
    listingId: listing.id,
    listingVersionId: versionId,
    category: terms.category,
    state: 'reserved',
    quantity: asked.quantity,
    handOver: shipped ? 'ship' : 'pickup',
    balanceDue: shipped ? 'before' : terms.balanceDue,
    needsAcceptance: terms.accept === 'ask',
    ...money,
    ...slot,
    buyerState: place.state,
    buyerCell: place.cellId,
    handOverCode: String(randomInt(0, 1_000_000)).padStart(6, '0'),
    clockAt: new Date(
      at.getTime() +
        (forgetful ? FORGETFUL.holdMinutes * MINUTE_MS : clockMs('checkoutHold', terms.category)),
    ),
    clockEdge: 'E02',
    createdAt: at,
    updatedAt: at,
  })
  if (shipped) await writeReserved(tx, shipped, { orderId, place, at })
  const by = caller.memberId
  const { quantity } = asked
  await noteStock(
    tx,
    { listingId: listing.id, orderId, reason: 'E01', quantity, by, at },
    { free: -quantity, held: quantity },
  )
  await insertPayment(tx, { orderId, purpose: 'deposit', amountCents: money.firstChargeCents, at })
  await writeEvent(tx, {
    orderId,
    commandId: asked.commandId,
    edge: 'E01',
    fromState: null,
    toState: 'reserved',
    actor: 'buyer',
    actorId: by,
    facts: { quantity },
    at,
  })
  await writeEvidence(tx, {
    orderId,
    memberId: by,
    party: 'buyer',
    shown: { verdict, ticked: asked.ticked },
    at,
  })
  await projectListings(tx, [listing.id])
  return orderId
}

/** Holds the fish and the slot and writes the order, all or nothing. Returns the order's number. */
export async function placeOrder(placing: Placing): Promise<number> {
  return inTransaction((tx) => write(tx, placing))
}
