import type { OrderRow } from '@/server/orders/order-store'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

type Asked = ParsedBody<Endpoints['decideOrder']>

/** What a moderator can say of a late box; the others are for a hand-over. */
export const LATE_OUTCOMES: readonly Asked['outcome'][] = ['arrived', 'lost']

function faultOf({ claimType }: OrderRow, { outcome, aliveCount }: Asked) {
  const isLate = claimType === 'late_or_lost'
  if (isLate !== LATE_OUTCOMES.includes(outcome)) {
    const detail = isLate
      ? 'This is about a late box: say that it arrived, with how many alive, or that it is lost.'
      : 'This is about a hand-over: say what happened there.'
    return { detail, pointer: '#/outcome' }
  }
  if (outcome === 'arrived' && aliveCount === undefined)
    return { detail: 'How many were alive?', pointer: '#/aliveCount' }
  if (outcome !== 'arrived' && aliveCount !== undefined)
    return { detail: 'A count of the living belongs to a box that arrived.', pointer: '#/aliveCount' }
  return null
}

/** Refuses an outcome that does not answer the question of this order's claim. */
export function requireFitting(order: OrderRow, asked: Asked): void {
  const fault = faultOf(order, asked)
  if (fault) throw new Problem('fields-invalid', undefined, { errors: [fault] })
}
