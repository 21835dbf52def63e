import { StyleSheet, View } from 'react-native'

import { zoneOf } from '@/components/orders/order-zone'
import { stateWord } from '@/components/orders/state-words'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printMoment } from '@/shared/times/print-time'

const byWhom: Record<string, string> = {
  buyer: 'by the buyer',
  seller: 'by the seller',
  both: 'by both',
  payment: 'by the payment',
  timer: 'by the clock',
  system: 'by the clock',
  carrier: 'by the carrier',
  admin: 'by our moderators',
}

/** What happened, oldest first, in the time of the place. */
export function OrderHistory({ order }: { order: ShownOrder }) {
  const zone = zoneOf(order)
  return (
    <Card labelledBy="order-history">
      <Heading level={2} size="lead" nativeID="order-history">
        What happened
      </Heading>
      <View role="list" style={styles.list}>
        {order.events.map((event) => (
          <View key={`${event.edge}-${event.at}`} role="listitem" style={styles.row}>
            <Text face="strong">{stateWord(event.to, order.handOver).word}</Text>
            <Text size="note" tint="muted">
              {`${printMoment(event.at, zone)}, ${byWhom[event.actor] ?? event.actor}`}
            </Text>
          </View>
        ))}
      </View>
    </Card>
  )
}

const styles = StyleSheet.create({ list: { gap: space.md }, row: { gap: 2 } })
