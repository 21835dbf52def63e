import type Stripe from 'stripe'
import { newId } from '../ids'
import type { Turn } from '../turn'
import type { EventName } from './event-row'

type ObjectOf<N extends EventName> = Extract<Stripe.Event, { type: N }>['data']['object']

interface Announcement<N extends EventName> {
  type: N
  object: ObjectOf<N>
  /** The connected account it happened to; left out: the platform's own. */
  accountId?: string
}

/** Writes an event with the object as it stands now; it is sent once the turn is committed. */
export function announce<N extends EventName>(turn: Turn, announcement: Announcement<N>): void {
  const id = newId('evt')
  turn.draft.put({
    table: 'events',
    row: {
      id,
      createdS: turn.nowS,
      type: announcement.type,
      object: announcement.object,
      accountId: announcement.accountId ?? null,
      requestId: turn.requestId,
      idempotencyKey: turn.idempotencyKey,
    },
  })
  if (turn.world.settings.webhookUrl) {
    turn.draft.put({ table: 'deliveries', row: { id, state: 'waiting', attempts: 0 } })
  }
}
