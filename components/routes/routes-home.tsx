import { StyleSheet, View } from 'react-native'

import { groupRoutes } from './group-routes'
import { RouteDay } from './route-day'

import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'
import { useRoutes } from '@/hooks/use-routes'

/** A seller's ways: who may see them, and every form the list can take. */
export function RoutesHome() {
  const { me, isPending } = useMe()
  const isSeller = Boolean(me?.sellerId)
  const query = useRoutes(isSeller)
  if (isPending) return <SkeletonRows label="Loading your routes" rows={3} />
  if (!me) {
    return (
      <EmptyState
        icon="lock"
        title="Sign in to see what you ship"
        body="Every order that leaves in a box stands here, by day."
        action={<ButtonLink label="Sign in" href="/sign-in?returnTo=/orders/routes" />}
      />
    )
  }
  if (!isSeller) {
    return (
      <EmptyState
        icon="truck"
        title="This page is for sellers"
        body="Name your farm and list a batch that can be shipped; its orders then stand here by day."
        action={<ButtonLink label="Start selling" href="/sell" />}
      />
    )
  }
  if (query.isPending) return <SkeletonRows label="Loading your routes" rows={3} />
  if (!query.data) {
    return (
      <ErrorState
        title="Your routes did not load"
        body={`${query.error.message} No order has changed.`}
        onRetry={() => void query.refetch()}
        isRetrying={query.isFetching}
      />
    )
  }
  const days = groupRoutes(query.data.rows)
  if (days.length === 0) {
    return (
      <EmptyState
        icon="truck"
        title="Nothing to ship"
        body="Orders that leave in a box appear here once their day is agreed."
        action={<ButtonLink kind="secondary" label="Your orders" href="/orders?as=seller" />}
      />
    )
  }
  return (
    <View style={styles.days}>
      <Text tint="muted">
        We look at every way by ourselves on the evening before and on the morning of the day. You can look at
        any time.
      </Text>
      {days.map((day) => (
        <RouteDay key={day.shipDay} day={day} />
      ))}
    </View>
  )
}

const styles = StyleSheet.create({ days: { gap: space.xl } })
