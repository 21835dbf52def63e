import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'
import { findState } from '@/shared/domain/rules/find-state'

/** Why a batch is not shipped to a state, in a sentence; null: it is. */
export function notShippedTo(terms: ListingBody, state: string): string | null {
  if (!terms.shipping) return 'The seller does not ship these animals. They can be collected.'
  const found = findState(state)
  if (found?.takesAnimals !== true) {
    return `Live animals are not shipped to ${found?.name ?? state}: no way there is short enough.`
  }
  if (!terms.statesServed.includes(state)) return `The seller does not ship to ${found.name}.`
  return null
}

/** The same as a refusal. */
export function requireShippedTo(terms: ListingBody, state: string): void {
  const why = notShippedTo(terms, state)
  if (why) throw new Problem('not-shipped', why)
}
