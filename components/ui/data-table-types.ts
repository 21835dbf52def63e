import type { ReactNode } from 'react'

export interface Column<Row> {
  key: string
  title: string
  cell: (row: Row) => ReactNode
  /** Makes the head a sort button. */
  sortBy?: (row: Row) => string | number
  isNumeric?: boolean
  minWidthPx?: number
}

export interface Sorting {
  key: string
  direction: 'ascending' | 'descending'
}

export interface DataTableProps<Row> {
  /** Names the table: "Batches". */
  label: string
  /** The first column names the row and stays in place while the rest scrolls. */
  columns: readonly Column<Row>[]
  rows: readonly Row[]
  rowKey: (row: Row) => string
  firstSorting?: Sorting
  /** Given when the server sorts: rows are then shown as they come. */
  onSort?: (sorting: Sorting) => void
  emptyText?: string
}
