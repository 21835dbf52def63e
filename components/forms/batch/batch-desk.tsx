import { useState } from 'react'

import { BatchForm } from './batch-form'
import { checkStep, stepOfField } from './batch-steps'

import { useToast } from '@/components/ui/toast'
import { forgetDraft } from '@/hooks/kept-drafts'
import { openDraft, type OpenedDraft } from '@/hooks/use-draft'
import { useReadOwnListing } from '@/hooks/use-submit-listing'

import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  own: OwnListing
  farm: OwnSeller
  units: UnitSystem
  /** A field to open with, named by a moderator's question. */
  atField?: string
}

interface Held {
  own: OwnListing
  opened: OpenedDraft
  /** A version the seller set aside; it can be brought back while this page is open. */
  shelved: ListingDraft | null
  round: number
}

/** Holds which draft the form was opened with: a new round begins when the seller chooses another one. */
export function BatchDesk({ own, farm, units, atField }: Props) {
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
  const takeNewer = (mine: ListingDraft) =>
    choose((newer) => ({ draft: newer.draft, unsent: false, shelved: mine }))
  const takeMine = (mine: ListingDraft) =>
    choose((newer) => ({ draft: mine, unsent: true, shelved: newer.draft }))

  const firstStep = atField ? stepOfField(atField) : 0
  return (
    <BatchForm
      key={held.round}
      own={held.own}
      opened={held.opened}
      farm={farm}
      units={units}
      shelved={held.shelved}
      firstStep={firstStep === checkStep ? 0 : firstStep}
      onLoadNewer={(mine) => void takeNewer(mine)}
      onKeepMine={(mine) => void takeMine(mine)}
    />
  )
}
