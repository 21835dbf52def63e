import { describe, expect, it } from 'vitest'
import { csvText } from '@/seed/places/csv-text'
import { listTowns } from '@/seed/places/list-towns'
import { sumCellPopulation } from '@/seed/places/sum-cell-population'

const place = (name: string, coordinates: [lng: number, lat: number], population: number) => ({
  name,
  country: 'US',
  featureCode: 'PPL',
  adminCode: 'OH',
  population,
  loc: { coordinates },
})

describe('people by cell', () => {
  it('sums the places of a cell and leaves out parts of a town, empty places and other countries', () => {
    const towns = listTowns([
      place('Alder', [-84.52, 39.12], 900),
      place('Birch', [-84.51, 39.13], 250),
      { ...place('Birch East', [-84.51, 39.13], 100), featureCode: 'PPLX' },
      place('Cedar', [-84.4, 39.12], 0),
      { ...place('Dorp', [-84.52, 39.12], 5000), country: 'NL' },
    ])
    expect(sumCellPopulation(towns, 50)).toEqual([
      { sizeThousandths: 50, iy: 2582, ix: 1909, population: 1150 },
    ])
    expect(sumCellPopulation(towns, 100)).toEqual([
      { sizeThousandths: 100, iy: 1291, ix: 954, population: 1150 },
    ])
  })

  it('quotes what a comma would break', () => {
    expect(csvText(['why'], ['name', 'n'], [['Century, KS', 1]])).toBe('# why\nname,n\n"Century, KS",1\n')
  })
})
