import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const BeginBatch = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.BeginBatch })),
)

export default function NewListingPage() {
  return (
    <Page title="List a batch" width="readable" back={{ label: 'Back to selling', href: '/sell' }}>
      <LazyPart label="Loading your earlier batches">
        <BeginBatch />
      </LazyPart>
    </Page>
  )
}
