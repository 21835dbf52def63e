import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { requirePlace } from '@/server/places/find-place'
import { openPayment } from '@/server/money/open-payment'
import { checkReservation } from '@/server/orders/check-reservation'
import { findOrderByCommand, readOrderById } from '@/server/orders/order-store'
import { placeOrder } from '@/server/orders/place-order'
import { showAgain } from '@/server/orders/show-order'
import { judgeListing } from '@/server/rules/judge-listing'
import { planReserved } from '@/server/shipping/plan-reserved'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

export type ReserveAsked = ParsedBody<Endpoints['reserveBatch']> & { commandId: string }

/**
 * E01: a member holds animals and a place in a pickup window, or boxes on a ship day, for 15 minutes. Load, check, then
 * in one transaction take the fish and the slot and write the order; the payment page is opened after the commit. When the processor
 * does not answer, the hold stands and the page can be opened again from the order.
 */
export async function reserveBatch(
  caller: Caller,
  listingId: string,
  asked: ReserveAsked,
): Promise<ShownOrder> {
  const before = await findOrderByCommand(caller.memberId, asked.commandId)
  if (before) {
    await openPayment(before.id, 'deposit')
    return showAgain({ order: before, party: 'buyer' })
  }
  const place = await requirePlace(asked.near, '#/near')
  const checked = await checkReservation(caller, listingId, asked)
  const verdict = await judgeListing({
    body: checked.terms,
    sellerState: checked.seller.state,
    buyerState: place.state,
    viewer: 'buyer',
  })
  checkGate(verdict, asked.ticked)
  const shipped = await planReserved({ asked, place, ...checked })
  const orderId = await placeOrder({ caller, asked, place, verdict, shipped, at: now(), ...checked })
  await openPayment(orderId, 'deposit')
  const order = await readOrderById(orderId)
  if (!order) throw new Problem('not-found')
  return showAgain({ order, party: 'buyer' })
}

function checkGate(verdict: Awaited<ReturnType<typeof judgeListing>>, ticked: string[]): void {
  if (verdict.buy === 'no') {
    const source = verdict.reasons.find((reason) => reason.status === 'prohibited')
    throw new Problem(
      'species-prohibited',
      source
        ? `We do not sell this species to ${verdict.buyerState}: ${source.sourceTitle} (${source.sourceDate}), checked ${source.checkedOn}.`
        : undefined,
    )
  }
  if (verdict.buy === 'ask-moderators') {
    throw new Problem(
      'rule-unknown',
      'Nobody has checked this species across that state line for us, so it cannot be paid for yet.',
    )
  }
  const missing = verdict.ticks.filter((tick) => !ticked.includes(tick.id))
  if (missing.length > 0) {
    throw new Problem('ticks-missing', undefined, {
      errors: missing.map((tick) => ({
        detail: `Please read and tick: ${tick.text}`,
        pointer: `#/ticked/${tick.id}`,
      })),
    })
  }
}
