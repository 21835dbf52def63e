import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { LazyPart } from '@/components/ui/lazy-part'

const OrderPage = lazy(() =>
  import('@/components/orders/orders-group').then((group) => ({ default: group.OrderPage })),
)

export default function OneOrderPage() {
  const { orderId, paid, left } = useLocalSearchParams<{ orderId: string; paid?: string; left?: string }>()
  return (
    <LazyPart label="Loading the order">
      <OrderPage orderId={orderId} from={{ paid, left }} />
    </LazyPart>
  )
}
