import type { Column, Sorting } from './data-table-types'

/** Rows in the order of the sorting; unsorted when no column of that key can sort. */
export function sortRows<Row>(
  rows: readonly Row[],
  columns: readonly Column<Row>[],
  sorting?: Sorting,
): readonly Row[] {
  const sortBy = columns.find((column) => column.key === sorting?.key)?.sortBy
  if (!sortBy) return rows
  const sign = sorting?.direction === 'descending' ? -1 : 1
  return rows.toSorted((a, b) => sign * compare(sortBy(a), sortBy(b)))
}

function compare(a: string | number, b: string | number): number {
  if (typeof a === 'number' && typeof b === 'number') return a - b
  return String(a).localeCompare(String(b), 'en', { numeric: true })
}

export function nextSorting(key: string, now?: Sorting): Sorting {
  const isSame = now?.key === key
  return { key, direction: isSame && now.direction === 'ascending' ? 'descending' : 'ascending' }
}
