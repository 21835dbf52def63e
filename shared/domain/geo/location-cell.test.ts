import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  buyerCellAt,
  cellAt,
  cellBounds,
  cellCentre,
  cellContains,
  widenCell,
  type CellSize,
} from '@/shared/domain/geo/location-cell'
import { fewestNeighbours, locationCellForSeller } from '@/shared/domain/geo/location-cell-for-seller'
import { parseCellId, printCellId } from '@/shared/domain/geo/location-cell-id'

const sizes = [50, 100, 200] as const
const anyPoint = fc.record({
  lat: fc.double({ min: -90, max: 90, noNaN: true }),
  lng: fc.double({ min: -180, max: 180, noNaN: true }),
})

function mustCell(lat: number, lng: number, size: CellSize = 50) {
  const cell = cellAt({ lat, lng }, size)
  if (!cell) throw new Error('expected a cell')
  return cell
}

describe('location cells', () => {
  it('gives every point of a cell the same centre', () => {
    expect(cellCentre(mustCell(39.1001, -84.5449))).toEqual({ lat: 39.125, lng: -84.525 })
    expect(cellCentre(mustCell(39.1499, -84.5001))).toEqual({ lat: 39.125, lng: -84.525 })
  })

  it('counts the south and west edge to the cell, the north and east edge to the next', () => {
    expect(mustCell(39.1, -84.55)).toEqual(mustCell(39.12, -84.52))
    expect(mustCell(39.15, -84.55).iy).toBe(mustCell(39.12, -84.52).iy + 1)
    expect(mustCell(39.1, -84.5).ix).toBe(mustCell(39.12, -84.52).ix + 1)
  })

  it('keeps the poles and the date line inside the grid', () => {
    expect(cellContains(mustCell(90, 180), { lat: 89.99, lng: 179.99 })).toBe(true)
    expect(mustCell(-90, -180)).toEqual({ sizeThousandths: 50, iy: 0, ix: 0 })
  })

  it.each([
    { lat: 91, lng: 0 },
    { lat: 0, lng: 181 },
    { lat: Number.NaN, lng: 0 },
    { lat: 0, lng: Infinity },
  ])('knows no cell for $lat, $lng', (point) => expect(cellAt(point, 50)).toBeNull())

  it('nests: the coarse cell of a point holds its fine cell, and holds the point', () => {
    fc.assert(
      fc.property(anyPoint, (point) => {
        const fine = mustCell(point.lat, point.lng)
        for (const size of sizes) {
          const cell = mustCell(point.lat, point.lng, size)
          expect(widenCell(fine, size)).toEqual(cell)
          expect(cellContains(cell, point) && cellContains(cell, cellCentre(fine))).toBe(true)
          const { south, north, west, east } = cellBounds(cell)
          expect(south - 1e-6 <= point.lat && point.lat <= north).toBe(true)
          expect(west - 1e-6 <= point.lng && point.lng <= east).toBe(true)
        }
      }),
    )
  })

  it('lands in the same cell again from its own centre', () => {
    fc.assert(
      fc.property(anyPoint, fc.constantFrom(...sizes), (point, size) => {
        const cell = mustCell(point.lat, point.lng, size)
        expect(cellAt(cellCentre(cell), size)).toEqual(cell)
      }),
    )
  })

  it('writes and reads its id', () => {
    expect(printCellId(mustCell(39.12, -84.52))).toBe('50.2582.1909')
    fc.assert(
      fc.property(anyPoint, fc.constantFrom(...sizes), (point, size) => {
        const cell = mustCell(point.lat, point.lng, size)
        expect(parseCellId(printCellId(cell))).toEqual(cell)
      }),
    )
  })

  it.each([
    '',
    '50.1',
    '25.1.1',
    '50.3600.0',
    '200.0.1800',
    '50.01.2',
    '50.-1.2',
    '50.1.2.3',
    '50.1.x',
    ' 50.1.2',
  ])('does not read the id %j', (text) => expect(parseCellId(text)).toBeNull())

  it('never sends a buyer finer or coarser than 0.05 degrees', () => {
    expect(buyerCellAt({ lat: 45, lng: -110 })?.sizeThousandths).toBe(50)
  })
})

describe('the cell of a seller', () => {
  const point = { lat: 39.12, lng: -84.52 }
  const sizeWith = (people: Partial<Record<CellSize, number>>) =>
    locationCellForSeller(point, (cell) => people[cell.sizeThousandths] ?? 0)?.sizeThousandths

  it('stays small in town and grows in thin country', () => {
    expect(sizeWith({ 50: fewestNeighbours })).toBe(50)
    expect(sizeWith({ 50: fewestNeighbours - 1, 100: fewestNeighbours })).toBe(100)
    expect(sizeWith({ 50: 3, 100: fewestNeighbours - 1 })).toBe(200)
    expect(sizeWith({})).toBe(200)
  })

  it('depends on the fine cell only, never on the point within it', () => {
    const inCell = fc.record({
      lat: fc.double({ min: 39.1001, max: 39.1499, noNaN: true }),
      lng: fc.double({ min: -84.5499, max: -84.5001, noNaN: true }),
    })
    fc.assert(
      fc.property(inCell, fc.integer({ min: 0, max: 2000 }), (other, people) => {
        const populationOf = () => people
        expect(locationCellForSeller(other, populationOf)).toEqual(locationCellForSeller(point, populationOf))
      }),
    )
  })
})
