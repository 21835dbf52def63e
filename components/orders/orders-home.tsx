import type { Href } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { OrderList } from '@/components/orders/order-list'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { Link } from '@/components/ui/link'
import { SkeletonRows } from '@/components/ui/skeleton'
import { color, radius, space, touchPx } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'

/** Orders, seen from the side of the counter one stands on. */
export function OrdersHome({ as }: { as: 'buyer' | 'seller' }) {
  const { me, isPending } = useMe()
  if (isPending) return <SkeletonRows label="Loading your orders" rows={4} />
  if (!me) {
    return (
      <EmptyState
        title="Sign in to see your orders"
        body="Every order keeps its pickup time, its money and its next step in one place."
        action={<ButtonLink label="Sign in" href="/sign-in?returnTo=/orders" />}
      />
    )
  }
  return (
    <View style={styles.home}>
      {me.roles.includes('seller') ? (
        <View role="navigation" aria-label="Side of the counter" style={styles.sides}>
          <Side href="/orders" words="I buy" isHere={as === 'buyer'} />
          <Side href="/orders?as=seller" words="I sell" isHere={as === 'seller'} />
        </View>
      ) : null}
      {as === 'seller' && me.sellerId ? (
        <View>
          <ButtonLink
            kind="secondary"
            icon="truck"
            href="/orders/routes"
            label="Routes: what you ship, by day"
            style={styles.routes}
          />
        </View>
      ) : null}
      <OrderList as={as} />
    </View>
  )
}

function Side({ href, words, isHere }: { href: Href; words: string; isHere: boolean }) {
  return (
    <Link href={href} isCurrent={isHere} style={[styles.side, isHere ? styles.here : null]}>
      {words}
    </Link>
  )
}

const styles = StyleSheet.create({
  home: { gap: space.lg },
  sides: { flexDirection: 'row', gap: space.sm },
  side: {
    minWidth: 96,
    paddingHorizontal: space.lg,
    lineHeight: touchPx,
    textAlign: 'center',
    textDecorationLine: 'none',
    borderRadius: radius.full,
    borderWidth: 1,
    borderColor: color.edge,
  },
  routes: { alignSelf: 'flex-start' },
  here: { backgroundColor: color.algae, color: color.onAlgae, borderColor: color.onAlgae },
})
