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
    minWidthPx: 180,
  },
  {
    key: 'verdict',
    title: 'The way',
    cell: (row) => <RouteVerdict row={row} />,
    sortBy: (row) => row.verdict ?? '',
    minWidthPx: 240,
  },
  {
    key: 'to',
    title: 'To',
    cell: (row) => `${row.buyerName}, ${row.to}, arrives ${dayWords(row.arriveDay)}`,
    sortBy: (row) => row.to,
    minWidthPx: 180,
  },
  {
    key: 'boxes',
    title: 'Boxes',
    cell: (row) => row.boxes,
    sortBy: (row) => row.boxes,
    isNumeric: true,
    minWidthPx: 64,
  },
  {
    key: 'state',
    title: 'Stands at',
    cell: (row) => `${stateWords[row.state]}. ${paidWords(row)}`,
    sortBy: (row) => Number(row.balancePaid),
    minWidthPx: 130,
  },
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
