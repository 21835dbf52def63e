import { StyleSheet, View } from 'react-native'

import { OrderRowCard } from '@/components/orders/order-row-card'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useOrders } from '@/hooks/use-orders'

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
  const waiting = orders.filter((order) => order.may.length > 0)
  const others = orders.filter((order) => order.may.length === 0)
  return (
    <View style={styles.list}>
      {waiting.length > 0 ? <Text face="strong">Waiting for you</Text> : null}
      {waiting.map((order) => (
        <OrderRowCard key={order.orderId} order={order} />
      ))}
      {others.length > 0 && waiting.length > 0 ? <Text face="strong">Others</Text> : null}
      {others.map((order) => (
        <OrderRowCard key={order.orderId} order={order} />
      ))}
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

const styles = StyleSheet.create({ list: { gap: space.md } })
