import { StyleSheet, View } from 'react-native'

import { KindChoice } from './kind-choice'
import { OrdersWaiting } from './orders-waiting'
import { OwnList } from './own-list'
import { PayoutsBanner } from './payouts-banner'
import { SellerGate } from './seller-gate'

import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

export function SellHome() {
  const isPhone = useBreakpoint() === 'phone'
  return (
    <SellerGate>
      {(farm, me) => (
        <View style={styles.home}>
          <OrdersWaiting count={me.waiting.orders} />
          <PayoutsBanner payouts={farm.payouts} />
          <View style={styles.head}>
            <View style={styles.farm}>
              <Heading level={2} size={isPhone ? 'lead' : 'title'}>
                {farm.farmName}
              </Heading>
              <Text size="note" tint="muted">
                {`${farm.publicPlace.label} · `}
                <Link href="/sell/farm" size="note">
                  Farm, licences and payouts
                </Link>
                {' · '}
                <Link href="/orders/routes" size="note">
                  What you ship
                </Link>
                {' · '}
                <Link href="/sell/record" size="note">
                  Your record
                </Link>
              </Text>
            </View>
          </View>
          <View style={styles.list}>
            <Heading level={2} size="lead">
              List something
            </Heading>
            <KindChoice />
          </View>
          <OwnList farm={farm} />
        </View>
      )}
    </SellerGate>
  )
}

const styles = StyleSheet.create({
  home: { gap: space.lg },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.lg },
  farm: { flexGrow: 1, flexShrink: 1, minWidth: 220, gap: 2 },
  list: { gap: space.sm },
})
