import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonRows } from '@/components/ui/skeleton'

const ReviewScreen = lazy(() =>
  import('@/components/moderation/moderation-group').then((group) => ({ default: group.ReviewScreen })),
)

export default function ReviewListingPage() {
  const { versionId } = useLocalSearchParams<{ versionId: string }>()
  return (
    <LazyPart label="Loading the listing" fallback={<Loading />}>
      <ReviewScreen key={versionId} versionId={versionId} />
    </LazyPart>
  )
}

function Loading() {
  return (
    <Page title="Review" back={{ label: 'Back to the queue', href: '/moderate' }}>
      <SkeletonRows label="Loading the listing" rows={6} />
    </Page>
  )
}
