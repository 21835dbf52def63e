import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const ManageListing = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.ManageListing })),
)

export default function ManageListingPage() {
  const { listingId } = useLocalSearchParams<{ listingId: string }>()
  return (
    <Page title="Your batch" back={{ label: 'Back to selling', href: '/sell' }}>
      <LazyPart label="Loading the batch">
        <ManageListing key={listingId} listingId={listingId} />
      </LazyPart>
    </Page>
  )
}
