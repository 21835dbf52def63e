import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const SellHome = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.SellHome })),
)

export default function SellPage() {
  return (
    <Page title="Sell">
      <LazyPart label="Loading your listings">
        <SellHome />
      </LazyPart>
    </Page>
  )
}
