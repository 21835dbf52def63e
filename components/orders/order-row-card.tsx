import { StyleSheet, View } from 'react-native'

import { isYourMove } from '@/components/orders/group-orders'
import { stateWord } from '@/components/orders/state-words'
import { Badge } from '@/components/ui/badge'
import { Photo } from '@/components/ui/photo'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { photoUrl } from '@/hooks/api'
import type { OrderRow } from '@/shared/contracts/orders'
import { whoseMove } from '@/shared/domain/orders/whose-move'
import { printDay, printSlot } from '@/shared/times/print-time'
import { printCents } from '@/shared/units/money'

const look = ({ pressed }: { pressed: boolean }) => [styles.card, pressed ? styles.pressed : null]

/** A pickup has its hours; of a box the day counts. */
function dayOf(slot: NonNullable<OrderRow['slot']>, handOver: OrderRow['handOver']): string {
  return handOver === 'ship' ? `Leaves ${printDay(slot.startsAt, slot.zone)}` : printSlot(slot)
}

/** One order in the list: what, with whom, when, and what it waits for. */
export function OrderRowCard({ order }: { order: OrderRow }) {
  const { word, tone } = stateWord(order.state, order.handOver)
  const isYours = isYourMove(order)
  const isOver = order.state === 'settled' || order.state === 'cancelled'
  return (
    <PressLink href={`/orders/${order.orderId}`} look={look}>
      {order.photo ? (
        <View style={styles.photo}>
          <Photo
            uri={photoUrl(order.photo.photoId, 320)}
            label={order.photo.alt}
            ratio={1}
            meanColor={order.photo.ground}
          />
        </View>
      ) : null}
      <View style={styles.words}>
        <Text face="title" size="lead">{`${order.quantity} × ${order.title}`}</Text>
        <Text size="note" tint="muted">{`${order.otherParty.name} · ${printCents(order.totalCents)}`}</Text>
        {order.slot ? <Text size="note">{dayOf(order.slot, order.handOver)}</Text> : null}
        <View style={styles.badges}>
          <Badge word={isYours ? 'Your move' : word} tone={isYours ? 'today' : tone} />
        </View>
        {isOver ? null : <Text size="note">{whoseMove(order).words}</Text>}
      </View>
    </PressLink>
  )
}

const styles = StyleSheet.create({
  card: {
    flexDirection: 'row',
    gap: space.md,
    padding: space.lg,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
  },
  pressed: { backgroundColor: color.sunk },
  photo: { width: 72, borderRadius: radius.tag, overflow: 'hidden' },
  words: { flex: 1, gap: 4, minWidth: 0 },
  badges: { flexDirection: 'row', gap: space.sm, flexWrap: 'wrap' },
})
