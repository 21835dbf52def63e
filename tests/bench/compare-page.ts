import type { BruteHit } from '@/tests/bench/brute-force'
import type { SearchHit } from '@/server/search/search-query'

const METRES_APART = 5

/** In what a page differs from brute force; null: in nothing. */
export function pageFault(found: readonly SearchHit[], expected: readonly BruteHit[]): string | null {
  if (found.length !== expected.length) return `${found.length} rows, not ${expected.length}`
  for (const [at, want] of expected.entries()) {
    const hit = found[at]
    if (hit?.listingId !== want.listingId)
      return `row ${at} is listing ${hit?.listingId}, not ${want.listingId}`
    if (hit.unitCents !== want.unitCents) return `row ${at} costs ${hit.unitCents}, not ${want.unitCents}`
    if (Math.abs(hit.distanceKm - want.distanceKm) * 1000 > METRES_APART) {
      return `row ${at} is ${hit.distanceKm} km away, not ${want.distanceKm}`
    }
  }
  return null
}
