import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { ListingLoading } from '@/components/listings/listing-loading'
import { readFind } from '@/components/find/find-params'
import { LazyPart } from '@/components/ui/lazy-part'

const ListingScreen = lazy(() =>
  import('@/components/listings/listing-group').then((group) => ({ default: group.ListingScreen })),
)

export default function ListingPage() {
  const { listingId, ...params } = useLocalSearchParams<'/listings/[listingId]'>()
  const { count, near } = readFind(params)
  return (
    <LazyPart label="Loading the listing" fallback={<ListingLoading />}>
      <ListingScreen key={listingId} listingId={listingId} wantedCount={count} linkedNear={near} />
    </LazyPart>
  )
}
