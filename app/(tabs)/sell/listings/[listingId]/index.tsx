import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { BatchPage } from '@/components/selling/batch-page'
import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonRows } from '@/components/ui/skeleton'

const BatchScreen = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.BatchScreen })),
)

export default function BatchFormPage() {
  const { listingId, at } = useLocalSearchParams<{ listingId: string; at?: string }>()
  return (
    <LazyPart label="Loading the form" fallback={<Loading />}>
      <BatchScreen key={listingId} listingId={listingId} atField={at} />
    </LazyPart>
  )
}

function Loading() {
  return (
    <BatchPage>
      <SkeletonRows label="Loading the form" rows={5} />
    </BatchPage>
  )
}
