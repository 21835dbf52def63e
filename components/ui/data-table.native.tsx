import { StyleSheet, View } from 'react-native'

import { Card } from './card'
import { sortRows } from './sort-rows'
import { Text } from './text'

import { space } from '@/constants/theme'

import type { DataTableProps } from './data-table-types'

// A phone has no room for columns: each row is a card of named values.
export function DataTable<Row>({
  label,
  columns,
  rows,
  rowKey,
  firstSorting,
  onSort,
  emptyText,
}: DataTableProps<Row>) {
  const shown = onSort ? rows : sortRows(rows, columns, firstSorting)
  return (
    <View role="list" aria-label={label} style={styles.list}>
      {shown.length === 0 ? <Text tint="muted">{emptyText ?? 'Nothing here yet'}</Text> : null}
      {shown.map((row) => (
        <Card key={rowKey(row)}>
          {columns.map((column) => {
            const content = column.cell(row)
            const isBare = typeof content === 'string' || typeof content === 'number'
            return (
              <View key={column.key} style={styles.line}>
                <Text size="note" tint="muted">
                  {column.title}
                </Text>
                {isBare ? <Text size="note">{String(content)}</Text> : content}
              </View>
            )
          })}
        </Card>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  list: { gap: space.md },
  line: { flexDirection: 'row', justifyContent: 'space-between', gap: space.md },
})
