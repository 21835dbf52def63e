import { useWatch } from 'react-hook-form'

import { seasonNote } from './season-note-words'

import { Banner } from '@/components/ui/banner'
import { useSeason } from '@/hooks/use-season'
import { findTaxon } from '@/shared/domain/species/find-taxon'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** Warns where the packing chosen hardly ever does, even for the shortest way: to a buyer in the farm's own area. */
export function SeasonNote({ farm }: { farm: OwnSeller }) {
  const taxonId = useWatch<BatchTyping, 'taxonId'>({ name: 'taxonId' })
  const packing = useWatch<BatchTyping, 'shipping.packing'>({ name: 'shipping.packing' })
  const species = findTaxon(taxonId)?.speciesId ?? ''
  const from = species && packing ? farm.zip : ''
  const { data, isPlaceholderData } = useSeason({ from, to: from, species, packing })
  const words = data && !isPlaceholderData && from ? seasonNote(data.weeks.map((week) => week.verdict)) : null
  if (!words) return null
  return (
    <Banner tone="caution" title={words.title} isLive>
      {words.body}
    </Banner>
  )
}
