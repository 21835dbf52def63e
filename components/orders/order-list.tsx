import { StyleSheet, View } from 'react-native'

import { groupOrders } from '@/components/orders/group-orders'
import { OrderRowCard } from '@/components/orders/order-row-card'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useOrders } from '@/hooks/use-orders'
import type { OrderRow } from '@/shared/contracts/orders'

/** The member's orders on one side of the counter: those that wait for them first, then the newest. */
export function OrderList({ as }: { as: 'buyer' | 'seller' }) {
  const query = useOrders(as)
  if (query.isPending) return <SkeletonRows label="Loading your orders" rows={4} />
  if (query.error && !query.data) {
    return (
      <ErrorState
        title="We could not load your orders"
        body={query.error.message}
        onRetry={() => void query.refetch()}
        isRetrying={query.isRefetching}
      />
    )
  }
  const orders = query.data.pages.flatMap((page) => page.items)
  if (orders.length === 0) {
    return as === 'buyer' ? (
      <EmptyState
        title="No orders yet"
        body="When you hold animals, the order and its pickup time stand here."
        action={<ButtonLink label="Find fish near you" href="/" />}
      />
    ) : (
      <EmptyState
        title="Nobody has ordered yet"
        body="Requests for your batches appear here, with the time you have to answer."
        action={<ButtonLink label="Your listings" href="/sell" />}
      />
    )
  }
  const { yours, coming, past } = groupOrders(orders)
  return (
    <View style={styles.list}>
      <OrderGroup title="Your move" orders={yours} />
      <OrderGroup title="Coming up" orders={coming} />
      <OrderGroup title="Past" orders={past} />
      {query.hasNextPage ? (
        <Button
          label="Show older orders"
          kind="secondary"
          isBusy={query.isFetchingNextPage}
          onPress={() => void query.fetchNextPage()}
        />
      ) : null}
    </View>
  )
}

function OrderGroup({ title, orders }: { title: string; orders: readonly OrderRow[] }) {
  const isWide = useBreakpoint() === 'wide'
  if (orders.length === 0) return null
  return (
    <View style={styles.group}>
      <Heading level={2} size="lead">
        {title}
      </Heading>
      <View role="list" aria-label={title} style={isWide ? styles.grid : styles.group}>
        {orders.map((order) => (
          <View key={order.orderId} role="listitem" style={isWide ? styles.half : null}>
            <OrderRowCard order={order} />
          </View>
        ))}
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  list: { gap: space.xl },
  group: { gap: space.md },
  grid: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
  // Two beside each other, however long their words.
  half: { flexBasis: '49%', minWidth: 0 },
})
