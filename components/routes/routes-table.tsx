import { StyleSheet, View } from 'react-native'

import { RouteVerdict } from './route-verdict'
import { paidWords, stateWords } from './route-words'

import { dayWords } from '@/components/shipping/ship-day-words'
import { DataTable } from '@/components/ui/data-table'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { touchPx } from '@/constants/theme'
import type { RouteRow } from '@/shared/contracts/ship-acts'

import type { Column } from '@/components/ui/data-table-types'

const columns: readonly Column<RouteRow>[] = [
  {
    key: 'title',
    title: 'Order',
    cell: (row) => <OrderLink row={row} />,
    sortBy: (row) => row.title,
    minWidthPx: 200,
  },
  {
    key: 'to',
    title: 'To',
    cell: (row) => `${row.buyerName}, ${row.to}`,
    sortBy: (row) => row.to,
    minWidthPx: 150,
  },
  { key: 'arriveDay', title: 'Arrives', cell: (row) => dayWords(row.arriveDay), minWidthPx: 104 },
  { key: 'boxes', title: 'Boxes', cell: (row) => row.boxes, sortBy: (row) => row.boxes, isNumeric: true },
  { key: 'paid', title: 'Money', cell: paidWords, sortBy: (row) => Number(row.balancePaid), minWidthPx: 104 },
  { key: 'state', title: 'Order stands', cell: (row) => stateWords[row.state], minWidthPx: 120 },
  { key: 'verdict', title: 'The way', cell: (row) => <RouteVerdict row={row} />, minWidthPx: 240 },
]

/** One ship day on a wide screen. */
export function RoutesTable({ label, rows }: { label: string; rows: readonly RouteRow[] }) {
  return <DataTable label={label} columns={columns} rows={rows} rowKey={(row) => row.orderId} />
}

function OrderLink({ row }: { row: RouteRow }) {
  return (
    <PressLink href={`/orders/${row.orderId}`} look={() => styles.link}>
      <View>
        <Text size="note" face="strong" tint="netting" style={styles.title}>
          {`${row.quantity} × ${row.title}`}
        </Text>
      </View>
    </PressLink>
  )
}

const styles = StyleSheet.create({
  link: { minHeight: touchPx, justifyContent: 'center' },
  title: { textDecorationLine: 'underline' },
})
