import { useState } from 'react'

import { HoldBar } from './hold-bar'
import { ListingFault } from './listing-fault'
import { ListingStory } from './listing-story'
import { countLimits, fitCount } from './order-count'
import { whyNotHeld } from './selling-state'

import { Page } from '@/components/layout/page'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useListing } from '@/hooks/use-listings'

interface Props {
  listingId: string
  /** From the link; whole numbers only. */
  wantedCount: number | undefined
  /** A place in the link goes before the place in use: it is the one the search was made for. */
  linkedNear: string | undefined
}

const back = { label: 'Back to find', href: '/' } as const

export function ListingScreen({ listingId, wantedCount, linkedNear }: Props) {
  const { place, isKnown } = useCurrentPlace()
  const [chosenNear, setChosenNear] = useState(linkedNear)
  const [chosenCount, setChosenCount] = useState(wantedCount)
  const near = chosenNear ?? place?.near
  const query = useListing(listingId, near, isKnown || chosenNear !== undefined)
  const listing = query.data
  if (!listing) {
    return (
      <Page title="Listing" isHeadingHidden back={back}>
        {query.isError ? (
          <ListingFault
            error={query.error}
            onRetry={() => void query.refetch()}
            isRetrying={query.isFetching}
          />
        ) : (
          <SkeletonRows label="Loading the listing" rows={3} />
        )}
      </Page>
    )
  }
  const limits = countLimits(listing.body, listing.free)
  const count = fitCount(chosenCount ?? limits.least, limits) ?? limits.least
  const refusal = whyNotHeld(listing)
  const footer = refusal ? undefined : <HoldBar listing={listing} count={count} near={chosenNear} />
  return (
    <Page title={listing.title} isHeadingHidden back={back} footer={footer}>
      <ListingStory
        listing={listing}
        count={count}
        limits={limits}
        refusal={refusal}
        placeLabel={chosenNear && chosenNear !== place?.near ? '' : (place?.label ?? '')}
        onCount={setChosenCount}
        onPlace={() => setChosenNear(undefined)}
      />
    </Page>
  )
}
