import { takeTurn, type Turn, type World } from '../turn'
import { expireSession } from './expire-session'
import { lapseIfDue } from './lapse'
import { settlePendingRefunds } from './refund-charge'

/** What time alone brings about: lapsed authorisations, expired pages, refunds that waited for money. */
export function sweep(turn: Turn): void {
  for (const payment of turn.draft.all('payments')) lapseIfDue(turn, payment)
  for (const session of turn.draft.all('sessions')) {
    if (session.status === 'open' && session.expiresAtS <= turn.nowS) expireSession(turn, session)
  }
  settlePendingRefunds(turn)
}

export function sweepIfDue(world: World): void {
  const nowS = world.clock.nowS()
  if (world.sweptAtS === nowS) return
  world.sweptAtS = nowS
  takeTurn(world, sweep)
}
