import { StyleSheet, View } from 'react-native'

import { HandOverCode } from '@/components/orders/hand-over-code'
import { HoldCountdown } from '@/components/orders/hold-countdown'
import { MoneyStrip } from '@/components/orders/money-strip'
import { OrderActs } from '@/components/orders/order-acts'
import { OrderFacts } from '@/components/orders/order-facts'
import { OrderHistory } from '@/components/orders/order-history'
import { OrderPathLine } from '@/components/orders/order-path-line'
import { stateWord } from '@/components/orders/state-words'
import { ArrivalGuide } from '@/components/shipping/arrival-guide'
import { MovementCard } from '@/components/shipping/movement-card'
import { RouteCheckCard } from '@/components/shipping/route-check-card'
import { AfterHandOver } from '@/components/ratings/after-hand-over'
import { Page } from '@/components/layout/page'
import { TwoColumns } from '@/components/layout/two-columns'
import { Badge } from '@/components/ui/badge'
import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useOrder } from '@/hooks/use-orders'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

const back = { label: 'Orders', href: '/orders' } as const

/** After the payment page: the money's own word may take a second to arrive. */
function Returned({ order, from }: { order: ShownOrder; from: { paid?: string; left?: string } }) {
  if (from.paid === 'deposit' && order.state === 'reserved') {
    return (
      <Banner tone="info" title="Waiting for the payment" isLive>
        <Text>The payment service is telling us. This page looks again by itself.</Text>
      </Banner>
    )
  }
  if (from.left === 'deposit' && order.state === 'reserved') {
    return (
      <Banner tone="caution" title="Not paid yet" isLive>
        <Text>You left the payment page. The animals stay held until the time above.</Text>
      </Banner>
    )
  }
  return null
}

/** One order, for whichever party looks at it. */
export function OrderPage({ orderId, from }: { orderId: string; from: { paid?: string; left?: string } }) {
  const { data: order, error, isPending, refetch, isRefetching, dataUpdatedAt } = useOrder(orderId)
  if (isPending) {
    return (
      <Page title="Order" back={back}>
        <SkeletonRows label="Loading the order" rows={5} />
      </Page>
    )
  }
  if (!order) {
    const isGone = error instanceof Problem && error.status === 404
    return (
      <Page title="Order" back={back}>
        <ErrorState
          title={isGone ? 'We know no such order' : 'We could not load this order'}
          body={isGone ? 'Look under Orders: it may belong to another account.' : (error?.message ?? '')}
          onRetry={isGone ? undefined : () => void refetch()}
          isRetrying={isRefetching}
        />
      </Page>
    )
  }
  const { word, tone } = stateWord(order.state, order.handOver)
  return (
    <Page
      title={`${order.quantity} × ${order.title}`}
      back={back}
      actions={
        <View style={styles.badge}>
          <Badge word={word} tone={tone} />
        </View>
      }
    >
      <OrderPathLine order={order} />
      <Returned order={order} from={from} />
      <TwoColumns
        sideLabel="Money"
        needsDesk
        // Once it is over, what became of the money is what one comes to see.
        isSideFirst={order.state === 'cancelled' || order.state === 'settled'}
        main={
          <View style={styles.column}>
            {order.state === 'reserved' && order.party === 'buyer' ? (
              <HoldCountdown order={order} receivedAtMs={dataUpdatedAt} />
            ) : null}
            {order.accepting ? (
              <Banner tone="info" title="Accepted: the deposit is being taken" isLive>
                <Text>This takes a few seconds, longer when the payment service is busy.</Text>
              </Banner>
            ) : null}
            {order.handOverCode ? <HandOverCode code={order.handOverCode} /> : null}
            <OrderActs order={order} />
            <AfterHandOver order={order} />
            <ArrivalGuide order={order} />
            <OrderFacts order={order} />
            {order.shipment ? <RouteCheckCard shipment={order.shipment} /> : null}
            {order.shipment?.movement ? (
              <MovementCard movement={order.shipment.movement} zone={order.shipment.toZone} />
            ) : null}
            <OrderHistory order={order} />
          </View>
        }
        side={
          <Card>
            <MoneyStrip order={order} />
            {order.state === 'cancelled' || order.state === 'settled' ? null : (
              <Text size="note" tint="muted">
                {order.party === 'buyer'
                  ? 'Your money is held by our payment processor until you confirm, or until the time above.'
                  : 'The buyer’s money is held by our payment processor until they confirm, or until the time above.'}
              </Text>
            )}
          </Card>
        }
      />
    </Page>
  )
}

const styles = StyleSheet.create({
  column: { gap: space.lg },
  // In line with the right edge of the cards below.
  badge: { paddingRight: space.sm },
})
