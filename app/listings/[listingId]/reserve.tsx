import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { LazyPart } from '@/components/ui/lazy-part'

const ReserveBatch = lazy(() =>
  import('@/components/orders/orders-group').then((group) => ({ default: group.ReserveBatch })),
)

export default function ReservePage() {
  const { listingId, count, way } = useLocalSearchParams<{
    listingId: string
    count?: string
    way?: string
  }>()
  return (
    <LazyPart label="Loading the reservation">
      <ReserveBatch listingId={listingId} count={count} way={way === 'ship' ? 'ship' : 'collect'} />
    </LazyPart>
  )
}
