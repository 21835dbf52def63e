import type { FarmFacts } from '@/seed/demo/farms.facts'
import type { Caller } from '@/server/http/caller'

/** A person of the demo, ready to act. */
export interface Actor {
  caller: Caller
  zip: string
  state: string
}

export interface Farm {
  facts: FarmFacts
  owner: Actor
  zone: string
}

/** Where the demo is played: who is there and what "now" is. */
export interface Stage {
  /** The moment the demo shows; everything else lies before it or is planned after it. */
  at: Date
  /** By key: the named people. */
  people: ReadonlyMap<string, Actor>
  growers: readonly Actor[]
  /** By key. */
  farms: ReadonlyMap<string, Farm>
}

/** Somebody or something that must be there by now. */
export function need<T>(found: T | null | undefined, what: string): T {
  if (found === null || found === undefined) throw new Error(`the demo has no ${what}`)
  return found
}
