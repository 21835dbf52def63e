import { useState } from 'react'

import { packingWords } from './packing-words'
import { SeasonAnswer } from './season-answer'

import { PlaceField } from '@/components/places/place-field'
import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { Select } from '@/components/ui/select'
import { SkeletonRows } from '@/components/ui/skeleton'
import type { KeptPlace } from '@/hooks/kept-place'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useSeason } from '@/hooks/use-season'
import type { PackingClassId } from '@/shared/domain/season/season-classes.facts'
import { animalClassOf, packingClassIds } from '@/shared/domain/season/season-lane'
import type { SpeciesId } from '@/shared/domain/species/species.facts'
import { speciesFacts } from '@/shared/domain/species/species.facts'

const shippable = speciesFacts
  .filter(({ id }) => animalClassOf(id) !== null)
  .map(({ id, commonName }) => ({ value: id, label: commonName }))
const packings = packingClassIds.map((id) => ({ value: id, label: packingWords[id] }))

/** When an animal usually survives the parcel from one place to another, week by week. */
export function SeasonPage() {
  const { place } = useCurrentPlace()
  const [from, setFrom] = useState<KeptPlace | null>(null)
  const [to, setTo] = useState<KeptPlace | null>(null)
  const [species, setSpecies] = useState<SpeciesId>('nile_tilapia')
  const [packing, setPacking] = useState<PackingClassId>('foam-38-overnight')
  const end = to ?? place
  const season = useSeason({ from: from?.near ?? '', to: end?.near ?? '', species, packing })
  return (
    <>
      <Card>
        <PlaceField label="Shipped from" placeLabel={from?.label ?? ''} onChoose={setFrom} />
        <PlaceField label="Shipped to" placeLabel={end?.label ?? ''} onChoose={setTo} />
        <Select label="Animal" value={species} choices={shippable} onChange={setSpecies} />
        <Select label="Packed in" value={packing} choices={packings} onChange={setPacking} />
      </Card>
      {season.data ? (
        <SeasonAnswer season={season.data} />
      ) : season.isError ? (
        <ErrorState
          title="The season could not be loaded"
          body={season.error.message}
          onRetry={() => void season.refetch()}
          isRetrying={season.isFetching}
        />
      ) : season.isFetching ? (
        <SkeletonRows label="Reckoning the season" rows={2} />
      ) : (
        <Banner tone="info" title="Say both places">
          A ZIP code or a town is enough: we reckon between areas, never addresses.
        </Banner>
      )}
    </>
  )
}
