import type { OrderEventRow } from '@/server/orders/order-store'

export interface Agreement {
  /** When the present time was agreed. */
  agreedAt: Date
  /** 0 for the first agreed time, one more with each move, each hold and with the end: the SEQUENCE of the calendar file. */
  sequence: number
}

type Told = Pick<OrderEventRow, 'fromState' | 'toState' | 'at'>

/** What an order's events say of its pickup time; null while none was ever agreed. Events are only added: it never falls. */
export function agreementOf(events: readonly Told[]): Agreement | null {
  const changes = events.filter((event) => event.fromState !== event.toState)
  const agreed = changes.filter((event) => event.toState === 'scheduled')
  const last = agreed.at(-1)
  if (!last) return null
  const isOver = changes.some((event) => event.toState === 'cancelled')
  const holds = changes.filter((event) => event.toState === 'weather_hold').length
  return { agreedAt: last.at, sequence: agreed.length - 1 + holds + (isOver ? 1 : 0) }
}
