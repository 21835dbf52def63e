import type { ListingDraft } from '@/shared/contracts/listings'

/** What was typed and has not reached the server yet. */
export interface KeptDraft {
  draft: ListingDraft
  /** The revision it was typed on top of. */
  baseRevision: number
}

const prefix = 'listing-draft:'

export function readKeptDraft(listingId: string): KeptDraft | null {
  try {
    const text = localStorage.getItem(prefix + listingId)
    return text ? (JSON.parse(text) as KeptDraft) : null
  } catch {
    return null // storage refused, or the entry is damaged: the server's draft is what there is
  }
}

export function keepDraft(listingId: string, kept: KeptDraft) {
  try {
    localStorage.setItem(prefix + listingId, JSON.stringify(kept))
  } catch {
    // Full or refused (private window): the draft still lives in the open form and goes to the server.
  }
}

export function forgetDraft(listingId: string) {
  try {
    localStorage.removeItem(prefix + listingId)
  } catch {
    // Nothing was kept.
  }
}

/** Signing out leaves no member's words on the device. */
export function forgetAllDrafts() {
  try {
    const names = Array.from({ length: localStorage.length }, (_, at) => localStorage.key(at) ?? '')
    for (const name of names) if (name.startsWith(prefix)) localStorage.removeItem(name)
  } catch {
    // Nothing was kept.
  }
}
