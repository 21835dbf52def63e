import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const OrdersHome = lazy(() =>
  import('@/components/orders/orders-group').then((group) => ({ default: group.OrdersHome })),
)

export default function OrdersPage() {
  const { as } = useLocalSearchParams<{ as?: string }>()
  return (
    <Page title="Orders">
      <LazyPart label="Loading your orders">
        <OrdersHome as={as === 'seller' ? 'seller' : 'buyer'} />
      </LazyPart>
    </Page>
  )
}
