import type { ListingBody } from '@/shared/contracts/listings'
import { claimWindowHours, promiseOf } from '@/shared/domain/listings/claim-promise'

/** The seller's arrival promise as one sentence, the same on every page and mail. */
export function promiseWords(terms: ListingBody): string {
  const promise = promiseOf(terms)
  const windowHours = claimWindowHours(terms)
  if (!promise) {
    return `As described, at the hand-over. Report what is wrong within ${windowHours} hours, with a photo; what is short or spoiled is refunded.`
  }
  const { survivalDays, remedy, evidence } = promise
  const survival = survivalDays > 0 ? `, and alive after ${survivalDays} days` : ''
  const cure = remedy === 'replace' ? 'replaced, or refunded if you prefer' : 'refunded'
  return `Alive at hand-over${survival}. Report losses within ${windowHours} hours; what is short is ${cure}. Show: ${evidence}`
}
