import { useState } from 'react'

import { useToast } from '@/components/ui/toast'
import { forgetDraft } from '@/hooks/kept-drafts'
import { openDraft, type OpenedDraft } from '@/hooks/use-draft'
import { useReadOwnListing } from '@/hooks/use-submit-listing'

import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'

interface Held {
  own: OwnListing
  opened: OpenedDraft
  /** A version the seller set aside; it can be brought back while this page is open. */
  shelved: ListingDraft | null
  round: number
}

/** Holds which draft a form was opened with: a new round begins when the seller chooses another one. */
export function useHeldDraft(own: OwnListing) {
  const [held, setHeld] = useState<Held>(() => ({ own, opened: openDraft(own), shelved: null, round: 0 }))
  const readAgain = useReadOwnListing(own.listingId)
  const toast = useToast()

  async function choose(
    pick: (newer: OwnListing) => { draft: ListingDraft; unsent: boolean; shelved: ListingDraft },
  ) {
    try {
      const newer = await readAgain()
      const { draft, unsent, shelved } = pick(newer)
      forgetDraft(own.listingId)
      setHeld({ own: newer, opened: { draft, unsent, rival: null }, shelved, round: held.round + 1 })
    } catch {
      toast({ tone: 'danger', text: 'The newer draft could not be read. Both are still kept.' })
    }
  }
  return {
    held,
    onLoadNewer: (mine: ListingDraft) =>
      void choose((newer) => ({ draft: newer.draft, unsent: false, shelved: mine })),
    onKeepMine: (mine: ListingDraft) =>
      void choose((newer) => ({ draft: mine, unsent: true, shelved: newer.draft })),
  }
}
