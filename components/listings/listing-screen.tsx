import { lazy, useState } from 'react'

import { NoConnection } from './no-connection'
import { countLimits, fitCount } from './order-count'
import { whyNotHeld } from './selling-state'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonBlock, SkeletonRows } from '@/components/ui/skeleton'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useListing } from '@/hooks/use-listings'

interface Props {
  listingId: string
  /** From the link; whole numbers only. */
  wantedCount: number | undefined
  /** A place in the link goes before the place in use: it is the one the search was made for. */
  linkedNear: string | undefined
}

const loadGroup = () => import('@/components/listings/listing-group')
const HoldBar = lazy(() => loadGroup().then((group) => ({ default: group.HoldBar })))
const ListingFault = lazy(() => loadGroup().then((group) => ({ default: group.ListingFault })))
const ListingStory = lazy(() => loadGroup().then((group) => ({ default: group.ListingStory })))

/** One page from loading to loaded: the keyboard stays where it is while the parts arrive. */
export function ListingScreen({ listingId, wantedCount, linkedNear }: Props) {
  const { place, isKnown } = useCurrentPlace()
  const [chosenNear, setChosenNear] = useState(linkedNear)
  const [chosenCount, setChosenCount] = useState(wantedCount)
  const near = chosenNear ?? place?.near
  const query = useListing(listingId, near, isKnown || chosenNear !== undefined)
  const listing = query.data
  const isElsewhere = chosenNear !== undefined && chosenNear !== place?.near
  const limits = listing ? countLimits(listing.body, listing.free) : null
  const count = limits ? (fitCount(chosenCount ?? limits.least, limits) ?? limits.least) : 1
  const refusal = listing ? whyNotHeld(listing) : null
  const footer =
    listing && !refusal ? (
      <LazyPart label="Loading" fallback={<SkeletonBlock heightPx={44} />}>
        <HoldBar listing={listing} count={count} near={isElsewhere ? chosenNear : undefined} />
      </LazyPart>
    ) : undefined
  return (
    <Page
      title={listing?.title ?? 'Listing'}
      isHeadingHidden
      back={{ label: 'Back to find', href: '/' }}
      footer={footer}
    >
      <LazyPart label="Loading the listing" fallback={<Waiting />}>
        {listing && limits ? (
          <ListingStory
            listing={listing}
            count={count}
            limits={limits}
            refusal={refusal}
            placeLabel={isElsewhere ? '' : (place?.label ?? '')}
            near={near}
            onCount={setChosenCount}
            onPlace={() => setChosenNear(undefined)}
          />
        ) : query.isError ? (
          <ListingFault
            error={query.error}
            onRetry={() => void query.refetch()}
            isRetrying={query.isFetching}
          />
        ) : query.isPaused ? (
          <NoConnection kept="Nothing is lost." onRetry={() => void query.refetch()} />
        ) : (
          <Waiting />
        )}
      </LazyPart>
    </Page>
  )
}

const Waiting = () => <SkeletonRows label="Loading the listing" rows={3} />
