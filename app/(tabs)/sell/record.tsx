import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const RecordHome = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.RecordHome })),
)

export default function RecordPage() {
  return (
    <Page title="Your record" back={{ label: 'Back to selling', href: '/sell' }}>
      <LazyPart label="Loading your record">
        <RecordHome />
      </LazyPart>
    </Page>
  )
}
