import type { Books } from './books/books'
import type { Draft } from './books/draft'
import type { Clock } from './clock'
import type { FakeSettings } from './settings'

/** The running practice processor, as its acts see it. */
export interface World {
  settings: FakeSettings
  books: Books
  clock: Clock
  /** Where its pages are reached; known once it listens. */
  origin: string
  /** The second of the last sweep: time alone changes nothing twice within one. */
  sweptAtS: number
}

/** One turn at the books: what is read and written for one request, one click or one tick of the clock. */
export interface Turn {
  world: World
  draft: Draft
  nowS: number
  requestId: string | null
  idempotencyKey: string | null
}

export interface Cause {
  requestId: string | null
  idempotencyKey: string | null
}

const nobody: Cause = { requestId: null, idempotencyKey: null }

export function openTurn(world: World, cause: Cause = nobody): Turn {
  return { world, draft: world.books.draft(), nowS: world.clock.nowS(), ...cause }
}

/** Runs an act and writes it down at once. */
export function takeTurn<R>(world: World, act: (turn: Turn) => R): R {
  const turn = openTurn(world)
  const result = act(turn)
  world.books.commit(turn.draft)
  return result
}
