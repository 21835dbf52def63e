import { useQueryClient } from '@tanstack/react-query'
import { useEffect, useState, useSyncExternalStore } from 'react'

import { call } from '@/hooks/api'
import { DraftKeeper } from '@/hooks/draft-keeper'
import { forgetDraft, keepDraft, readKeptDraft } from '@/hooks/kept-drafts'
import { ownListingKey } from '@/hooks/own-listing-query'
import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'

const pauseMs = 900
const retryMs = 15_000

/** Which words the form opens with, and what else was typed on this device on top of an older revision. */
export interface OpenedDraft {
  draft: ListingDraft
  unsent: boolean
  rival: ListingDraft | null
}

/** Words kept on the device win when nobody saved meanwhile; otherwise the seller chooses. */
export function openDraft(own: OwnListing): OpenedDraft {
  const kept = readKeptDraft(own.listingId)
  if (!kept) return { draft: own.draft, unsent: false, rival: null }
  if (kept.baseRevision >= own.draftRevision) return { draft: kept.draft, unsent: true, rival: null }
  return { draft: own.draft, unsent: false, rival: kept.draft }
}

/** Saves a listing's draft by itself while its form is open. */
export function useDraft(own: OwnListing, opened: OpenedDraft) {
  const client = useQueryClient()
  const { listingId } = own
  const [keeper] = useState(() => {
    const made = new DraftKeeper(own.draftRevision, {
      send: async (draft, draftRevision) => {
        const saved = await call('saveDraft', { params: { listingId }, body: { draft, draftRevision } })
        client.setQueryData<OwnListing>(ownListingKey(listingId), (known) =>
          known ? { ...known, draft, draftRevision: saved.draftRevision } : known,
        )
        return saved
      },
      keep: (draft, baseRevision) => keepDraft(listingId, { draft, baseRevision }),
      forget: () => forgetDraft(listingId),
      pauseMs,
      retryMs,
    })
    if (opened.rival) made.markStale()
    return made
  })
  const state = useSyncExternalStore(keeper.listen, keeper.readState, keeper.readState)
  useEffect(() => {
    if (opened.unsent) keeper.type(opened.draft)
    return keeper.rest
  }, [keeper, opened])
  useEffect(() => {
    if (typeof addEventListener !== 'function') return
    addEventListener('online', keeper.retry)
    return () => removeEventListener('online', keeper.retry)
  }, [keeper])
  return { state, keeper }
}
