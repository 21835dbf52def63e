import { useMutation } from '@tanstack/react-query'
import { useState } from 'react'

import { firstDraft, nextHarvest } from '@/components/selling/first-draft'
import { licenceWords } from '@/components/forms/batch/licence-words'
import type { Category } from '@/components/find/find-params'
import { newRequestKey } from '@/hooks/request-key'
import { useBeginListing, useFillDraft } from '@/hooks/use-own-listings'
import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'

interface Wish {
  kind: Category
  /** Another one like this. */
  copyOf: OwnListing | undefined
  /** The last listing of the kind: how the farm works is remembered from it. */
  last: OwnListing | undefined
}

/** Begins a draft and, beside fish, fills in what need not be asked again. */
export function useBegin(farm: OwnSeller) {
  const begin = useBeginListing()
  const fill = useFillDraft()
  const [key] = useState(newRequestKey)
  return useMutation({
    mutationFn: async ({ kind, copyOf, last }: Wish) => {
      // One key a choice: pressing the same twice begins one draft.
      const choice = (copyOf?.listingId ?? `empty-${kind}`).slice(0, 24)
      const own = await begin.mutateAsync({ copyOf: copyOf?.listingId, key: `${key}-${choice}` })
      const draft = startOf(own, { kind, copyOf, last }, farm)
      return draft ? fill.mutateAsync({ own, draft }) : own
    },
  })
}

/** null: the draft stands as the server made it. */
function startOf(own: OwnListing, { kind, copyOf, last }: Wish, farm: OwnSeller): ListingDraft | null {
  if (kind === 'fish' || own.draftRevision > 0) return null
  if (copyOf) return kind === 'produce' ? nextHarvest(own.draft, farmClock(farm.zone)) : null
  const licenceNumbers = licenceWords(farm.licences)
  return firstDraft(kind, { ownState: farm.state, licenceNumbers, last: last?.draft })
}

/** Day and time by the clock at the farm. */
function farmClock(timeZone: string) {
  const now = new Date()
  return {
    day: new Intl.DateTimeFormat('en-CA', { timeZone }).format(now),
    time: new Intl.DateTimeFormat('en-GB', {
      timeZone,
      hour: '2-digit',
      minute: '2-digit',
      hourCycle: 'h23',
    }).format(now),
  }
}
