import { StyleSheet, View } from 'react-native'

import { shortMonth } from './record-words'

import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { SellerRecord } from '@/shared/contracts/statements'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

type Month = SellerRecord['months'][number]

const sumOf = ({ kinds }: Month) => kinds.reduce((sum, { goodsCents }) => sum + goodsCents, 0)

/** Goods sold by kind, a bar a month, cut where one kind ends; the kinds stand below it in the order of the cuts. */
export function SalesPlot({ months }: Pick<SellerRecord, 'months'>) {
  const most = Math.max(1, ...months.map(sumOf))
  return (
    <View style={styles.plot}>
      {months.map((month) => (
        <View key={month.month} style={styles.row}>
          <Text size="note" tint="muted" style={styles.month}>
            {shortMonth(month.month)}
          </Text>
          <View style={styles.middle}>
            {month.kinds.length > 0 ? <Bar month={month} most={most} /> : null}
            <Text size="note" tint="muted">
              {month.kinds.length > 0
                ? month.kinds.map(({ name, quantity }) => `${printCount(quantity)} ${name}`).join(', ')
                : 'Nothing released'}
            </Text>
          </View>
          <Text size="note" isFigures style={styles.sum}>
            {printCents(sumOf(month))}
          </Text>
        </View>
      ))}
    </View>
  )
}

function Bar({ month, most }: { month: Month; most: number }) {
  return (
    <View style={styles.bar}>
      {month.kinds.map(({ name, goodsCents }) => (
        <View key={name} style={[styles.part, { width: `${(goodsCents / most) * 100}%` }]} />
      ))}
    </View>
  )
}

const BAR_PX = 14
const styles = StyleSheet.create({
  plot: { gap: space.sm },
  row: { flexDirection: 'row', gap: space.md },
  month: { width: 52 },
  middle: { flex: 1, gap: 2 },
  bar: { flexDirection: 'row', height: BAR_PX },
  part: {
    height: BAR_PX,
    minWidth: 3,
    backgroundColor: color.netting,
    borderRightWidth: 2,
    borderColor: color.card,
  },
  sum: { minWidth: 80, textAlign: 'right' },
})
