import type { ListingBody } from '@/shared/contracts/listings'

/** The seller's arrival promise as one sentence, the same on every page and mail. */
export function promiseWords(promise: ListingBody['promise']): string {
  const { windowHours, survivalDays, remedy, evidence } = promise
  const survival = survivalDays > 0 ? `, and alive after ${survivalDays} days` : ''
  const cure = remedy === 'replace' ? 'replaced, or refunded if you prefer' : 'refunded'
  return `Alive at hand-over${survival}. Report losses within ${windowHours} hours; what is short is ${cure}. Show: ${evidence}`
}
