import { useState } from 'react'
import { Pressable, StyleSheet } from 'react-native'

import { Icon } from './icon'
import { nextSorting, sortRows } from './sort-rows'
import { Text } from './text'
import { webElement } from './web-element'

import { color, font, space, touchPx, type } from '@/constants/theme'

import type { Column, DataTableProps, Sorting } from './data-table-types'

export function DataTable<Row>(props: DataTableProps<Row>) {
  const { label, columns, rows, rowKey, emptyText = 'Nothing here yet' } = props
  const [sorting, setSorting] = useState(props.firstSorting)
  const shown = props.onSort ? rows : sortRows(rows, columns, sorting)
  function sort(key: string) {
    const next = nextSorting(key, sorting)
    setSorting(next)
    props.onSort?.(next)
  }
  const head = columns.map((column, index) => (
    <Head
      key={column.key}
      column={column}
      isFirst={index === 0}
      sorting={sorting}
      onSort={() => sort(column.key)}
    />
  ))
  const body = shown.map((row) =>
    webElement('tr', {
      key: rowKey(row),
      children: columns.map((column, index) => (
        <Cell key={column.key} column={column} isFirst={index === 0} row={row} />
      )),
    }),
  )
  const table = webElement('table', {
    'aria-label': label,
    style: styles.table,
    children: [
      webElement('thead', { key: 'head', children: webElement('tr', { children: head }) }),
      webElement('tbody', {
        key: 'body',
        children: shown.length > 0 ? body : emptyRow(columns.length, emptyText),
      }),
    ],
  })
  return webElement('div', {
    role: 'region',
    'aria-label': label,
    tabIndex: 0,
    style: styles.frame,
    children: table,
  })
}

function emptyRow(columnCount: number, text: string) {
  const words = <Text tint="muted">{text}</Text>
  return webElement('tr', {
    children: webElement('td', { colSpan: columnCount, style: styles.cell, children: words }),
  })
}

interface HeadProps<Row> {
  column: Column<Row>
  isFirst: boolean
  sorting?: Sorting
  onSort: () => void
}

function Head<Row>({ column, isFirst, sorting, onSort }: HeadProps<Row>) {
  const direction = sorting?.key === column.key ? sorting.direction : undefined
  const words = (
    <Text size="note" face="strong">
      {column.title}
    </Text>
  )
  const arrow = direction === 'descending' ? 'down' : 'up'
  return webElement('th', {
    scope: 'col',
    'aria-sort': column.sortBy ? (direction ?? 'none') : undefined,
    style: [styles.cell, styles.head, isFirst && styles.firstHead, column.isNumeric && styles.numeric],
    children: column.sortBy ? (
      <Pressable role="button" onPress={onSort} style={[styles.sort, column.isNumeric && styles.sortNumeric]}>
        {words}
        <Icon name={arrow} sizePx={16} tint={direction ? 'netting' : 'edge'} />
      </Pressable>
    ) : (
      words
    ),
  })
}

interface CellProps<Row> {
  column: Column<Row>
  isFirst: boolean
  row: Row
}

function Cell<Row>({ column, isFirst, row }: CellProps<Row>) {
  const content = column.cell(row)
  const isBare = typeof content === 'string' || typeof content === 'number'
  return webElement(isFirst ? 'th' : 'td', {
    scope: isFirst ? 'row' : undefined,
    style: [
      styles.cell,
      isFirst && styles.first,
      column.isNumeric && styles.numeric,
      column.minWidthPx ? { minWidth: column.minWidthPx } : null,
    ],
    children: isBare ? (
      <Text size="note" face={isFirst ? 'strong' : 'body'} isFigures={column.isNumeric}>
        {String(content)}
      </Text>
    ) : (
      content
    ),
  })
}

const sticky = { position: 'sticky', left: 0 } as object

const styles = StyleSheet.create({
  frame: {
    overflow: 'scroll',
    borderWidth: 1,
    borderStyle: 'solid',
    borderColor: color.line,
    backgroundColor: color.card,
  },
  table: { width: '100%' },
  cell: {
    ...type.note,
    ...font.body,
    paddingHorizontal: space.md,
    paddingVertical: space.sm,
    height: touchPx,
    textAlign: 'left',
    verticalAlign: 'middle',
    borderWidth: 0,
    borderBottomWidth: 1,
    borderStyle: 'solid',
    borderColor: color.line,
  },
  head: { backgroundColor: color.sunk, paddingVertical: 0 },
  first: { ...sticky, backgroundColor: color.card, fontWeight: '400' },
  firstHead: { ...sticky },
  numeric: { textAlign: 'right' },
  sort: { width: '100%', minHeight: touchPx, flexDirection: 'row', alignItems: 'center', gap: space.xs },
  sortNumeric: { justifyContent: 'flex-end' },
})
