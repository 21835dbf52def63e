import { StyleSheet } from 'react-native'

import { RouteVerdict } from './route-verdict'
import { paidWords, stateWords } from './route-words'

import { dayWords } from '@/components/shipping/ship-day-words'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import type { RouteRow } from '@/shared/contracts/ship-acts'

const look = ({ pressed }: { pressed: boolean }) => [styles.card, pressed ? styles.pressed : null]

/** One order to ship on a phone. */
export function RouteCard({ row }: { row: RouteRow }) {
  const boxes = row.boxes === 1 ? '1 box' : `${row.boxes} boxes`
  return (
    <PressLink href={`/orders/${row.orderId}`} look={look}>
      <Text face="title" size="lead">{`${row.quantity} × ${row.title}`}</Text>
      <Text size="note">{`${row.buyerName}, ${row.to}, arrives ${dayWords(row.arriveDay)}`}</Text>
      <Text size="note" tint="muted">
        {[boxes, paidWords(row), stateWords[row.state]].join(' · ')}
      </Text>
      <RouteVerdict row={row} />
    </PressLink>
  )
}

const styles = StyleSheet.create({
  card: {
    gap: 4,
    padding: space.lg,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
  },
  pressed: { backgroundColor: color.sunk },
})
