import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const Payouts = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.Payouts })),
)

export default function PayoutsPage() {
  return (
    <Page title="Payouts" width="readable" back={{ label: 'Back to selling', href: '/sell' }}>
      <LazyPart label="Loading your payouts">
        <Payouts />
      </LazyPart>
    </Page>
  )
}
