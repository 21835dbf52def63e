import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const RoutesHome = lazy(() =>
  import('@/components/orders/orders-group').then((group) => ({ default: group.RoutesHome })),
)

export default function RoutesPage() {
  return (
    <Page title="Routes" back={{ label: 'Orders', href: '/orders?as=seller' }}>
      <LazyPart label="Loading your routes">
        <RoutesHome />
      </LazyPart>
    </Page>
  )
}
