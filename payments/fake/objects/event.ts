import type Stripe from 'stripe'
import type { Turn } from '../turn'
import type { EventRow } from '../webhooks/event-row'

export const API_VERSION = '2026-10-28.endive'

export function presentEvent(turn: Turn, row: EventRow): Stripe.EventBase {
  const waiting = turn.draft.get('deliveries', row.id)?.state === 'waiting'
  return {
    id: row.id,
    object: 'event',
    ...(row.accountId === null ? {} : { account: row.accountId }),
    api_version: API_VERSION,
    created: row.createdS,
    data: { object: row.object },
    livemode: false,
    pending_webhooks: waiting ? 1 : 0,
    request: { id: row.requestId, idempotency_key: row.idempotencyKey },
    type: row.type,
  }
}
