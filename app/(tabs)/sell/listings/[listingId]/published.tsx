import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const Published = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.Published })),
)

export default function PublishedPage() {
  const { listingId } = useLocalSearchParams<{ listingId: string }>()
  return (
    <Page title="Your batch is sent" width="readable" back={{ label: 'Back to selling', href: '/sell' }}>
      <LazyPart label="Loading the batch">
        <Published key={listingId} listingId={listingId} />
      </LazyPart>
    </Page>
  )
}
