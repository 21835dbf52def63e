import { useLocalSearchParams } from 'expo-router'

import { readFind } from '@/components/find/find-params'
import { ListingScreen } from '@/components/listings/listing-screen'

export default function ListingPage() {
  const { listingId, ...params } = useLocalSearchParams<'/listings/[listingId]'>()
  const { count, near } = readFind(params)
  return <ListingScreen key={listingId} listingId={listingId} wantedCount={count} linkedNear={near} />
}
