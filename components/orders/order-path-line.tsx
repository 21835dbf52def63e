import { StyleSheet, View } from 'react-native'

import { zoneOf } from '@/components/orders/order-zone'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import type { ShownOrder } from '@/shared/contracts/orders'
import { orderPath, type OrderPath } from '@/shared/domain/orders/order-path'
import { printMoment } from '@/shared/times/print-time'

function pathOf(order: ShownOrder): OrderPath {
  const { state, party, handOver, balanceDue, balancePaid, reason, needsAcceptance, clock } = order
  return orderPath({
    ...{ state, party, handOver, balanceDue, balancePaid, reason, needsAcceptance },
    isPooled: false,
    hasArrived: Boolean(order.shipment?.arrivedAt),
    clock: clock ? { atMs: Date.parse(clock.at), edge: clock.edge } : null,
  })
}

/** Where the order is, whose move it is, until when, and what happens if nobody moves: always on top. */
export function OrderPathLine({ order }: { order: ShownOrder }) {
  const path = pathOf(order)
  const zone = zoneOf(order)
  const until = path.untilMs === null ? null : printMoment(new Date(path.untilMs).toISOString(), zone)
  const isYours = path.move.whose === 'you' || path.move.whose === 'both'
  return (
    <View style={[styles.box, isYours ? styles.yours : null]}>
      {order.state === 'cancelled' ? null : (
        <View role="list" aria-label="Steps of this order" style={styles.steps}>
          {path.steps.map(({ step, words, mark }) => (
            <View key={step} role="listitem" style={styles.step}>
              <View style={[styles.dot, styles[mark]]}>
                {mark === 'done' ? <Icon name="check" sizePx={12} tint="onNetting" /> : null}
              </View>
              <Text
                size="small"
                face={mark === 'now' ? 'strong' : 'body'}
                tint={mark === 'ahead' ? 'muted' : 'ink'}
              >
                {words}
                {mark === 'now' ? ' (now)' : ''}
              </Text>
            </View>
          ))}
        </View>
      )}
      <Text size="lead" face="strong" aria-live="polite">
        {isYours ? `Your move: ${path.move.words}` : path.move.words}
      </Text>
      {until && path.ifNobodyMoves ? (
        <Text tint="muted">
          Until {until}; if nobody moves, {path.ifNobodyMoves}.
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  box: {
    gap: space.sm,
    padding: space.lg,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    borderLeftWidth: 6,
    borderLeftColor: color.line,
  },
  yours: { borderLeftColor: color.algae },
  steps: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.lg, rowGap: space.xs },
  step: { flexDirection: 'row', alignItems: 'center', gap: 6 },
  dot: {
    width: 16,
    height: 16,
    borderRadius: radius.full,
    borderWidth: 2,
    alignItems: 'center',
    justifyContent: 'center',
    borderColor: color.edge,
  },
  done: { backgroundColor: color.netting, borderColor: color.netting },
  now: { backgroundColor: color.algae, borderColor: color.ink },
  ahead: { backgroundColor: color.card },
})
