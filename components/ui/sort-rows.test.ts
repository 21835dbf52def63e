import { describe, expect, it } from 'vitest'

import { nextSorting, sortRows } from './sort-rows'

import type { Column } from './data-table-types'

interface Batch {
  species: string
  fishLeft: number
}

const batches: Batch[] = [
  { species: 'Nile tilapia', fishLeft: 240 },
  { species: 'channel catfish', fishLeft: 10_000 },
  { species: 'Bluegill', fishLeft: 9 },
]
const columns: Column<Batch>[] = [
  { key: 'species', title: 'Species', cell: (row) => row.species, sortBy: (row) => row.species },
  { key: 'left', title: 'Left', cell: (row) => row.fishLeft, sortBy: (row) => row.fishLeft },
  { key: 'note', title: 'Note', cell: () => '' },
]
const left = (direction: 'ascending' | 'descending') =>
  sortRows(batches, columns, { key: 'left', direction }).map(({ fishLeft }) => fishLeft)

describe('sorting a table', () => {
  it('sorts counts as numbers, both ways', () => {
    expect(left('ascending')).toEqual([9, 240, 10_000])
    expect(left('descending')).toEqual([10_000, 240, 9])
  })

  it('sorts names without regard to capitals', () => {
    const names = sortRows(batches, columns, { key: 'species', direction: 'ascending' }).map(
      ({ species }) => species,
    )
    expect(names).toEqual(['Bluegill', 'channel catfish', 'Nile tilapia'])
  })

  it('leaves the rows as they came when the column cannot sort', () => {
    expect(sortRows(batches, columns, { key: 'note', direction: 'ascending' })).toEqual(batches)
    expect(sortRows(batches, columns)).toEqual(batches)
  })

  it('turns the direction on a second press and starts upwards on another column', () => {
    const first = nextSorting('left')
    expect(first).toEqual({ key: 'left', direction: 'ascending' })
    expect(nextSorting('left', first)).toEqual({ key: 'left', direction: 'descending' })
    expect(nextSorting('species', nextSorting('left', first))).toEqual({
      key: 'species',
      direction: 'ascending',
    })
  })
})
