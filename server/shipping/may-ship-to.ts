import { Problem } from '@/shared/api/problem'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { ListingBody } from '@/shared/contracts/listings'
import { thingsOf } from '@/shared/domain/listings/count-words'
import { findState } from '@/shared/domain/rules/find-state'

/** Why a batch is not shipped to a state, in a sentence; null: it is. */
export function notShippedTo(terms: ListingBody, state: string): string | null {
  if (terms.category !== 'fish' || !terms.shipping) {
    return `The seller does not ship these ${thingsOf(terms)}. They can be collected.`
  }
  const found = findState(state)
  if (found?.takesAnimals !== true) {
    return `Live animals are not shipped to ${found?.name ?? state}: no way there is short enough.`
  }
  if (!terms.statesServed.includes(state)) return `The seller does not ship to ${found.name}.`
  return null
}

/** The same as a refusal; what is shipped is a batch of fish. */
export function requireShippedTo(terms: ListingBody, state: string): FishBody {
  const why = notShippedTo(terms, state)
  if (why !== null || terms.category !== 'fish') throw new Problem('not-shipped', why ?? undefined)
  return terms
}
