import type { ListingDraft } from '@/shared/contracts/listings'

export interface KeptDraft {
  draft: ListingDraft
  baseRevision: number
}

// Held for as long as the app runs: the native app has no store for words of this size yet.
const kept = new Map<string, KeptDraft>()

export function readKeptDraft(listingId: string): KeptDraft | null {
  return kept.get(listingId) ?? null
}

export function keepDraft(listingId: string, draft: KeptDraft) {
  kept.set(listingId, draft)
}

export function forgetDraft(listingId: string) {
  kept.delete(listingId)
}

export function forgetAllDrafts() {
  kept.clear()
}
