import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { cellAt } from '@/shared/domain/geo/location-cell'
import { locationCellForSeller } from '@/shared/domain/geo/location-cell-for-seller'
import { findState } from '@/shared/domain/rules/find-state'

function rowsOf(file: string): string[][] {
  const lines = readFileSync(`assets/data/${file}`, 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
  return lines
    .slice(1)
    .map((line) =>
      [...line.matchAll(/("(?:[^"]|"")*"|[^,]*)(?:,|$)/g)]
        .slice(0, -1)
        .map((cell) => (cell[1] ?? '').replace(/^"|"$/g, '')),
    )
}

const zips = new Map(
  rowsOf('zips.csv').map(([zip = '', city = '', state = '', lat, lng]) => [
    zip,
    { city, state, lat: Number(lat), lng: Number(lng) },
  ]),
)
const towns = rowsOf('cities.csv').map(([name = '', state = '', lat, lng, population]) => ({
  name,
  state,
  lat: Number(lat),
  lng: Number(lng),
  population: Number(population),
}))

/** Haversine, mean radius 6,371.0088 km: enough for kilometres. */
function apartKm(one: { lat: number; lng: number }, other: { lat: number; lng: number }): number {
  const rad = Math.PI / 180
  const half =
    Math.sin(((other.lat - one.lat) * rad) / 2) ** 2 +
    Math.cos(one.lat * rad) * Math.cos(other.lat * rad) * Math.sin(((other.lng - one.lng) * rad) / 2) ** 2
  return 2 * 6371.0088 * Math.asin(Math.sqrt(half))
}

// US Census Bureau, Gazetteer 2021, internal points of ZIP Code Tabulation Areas.
const censusPoints: Record<string, [lat: number, lng: number]> = {
  '10001': [40.75065, -73.997293],
  '07030': [40.745251, -74.027926],
  '60601': [41.885155, -87.621512],
  '60614': [41.922747, -87.647153],
  '37214': [36.169038, -86.662565],
  '37067': [35.912202, -86.768842],
  '54301': [44.480778, -88.016063],
  '54115': [44.405368, -88.08935],
  '80202': [39.751526, -104.997673],
  '80302': [40.025056, -105.348664],
  '94103': [37.772983, -122.411343],
  '95814': [38.580568, -121.49559],
  '97201': [45.508551, -122.688283],
  '98101': [47.610902, -122.336422],
}

describe('ZIP table', () => {
  it('holds the expected number of ZIPs, none twice', () => {
    expect(zips.size).toBe(41_911)
    expect(rowsOf('zips.csv')).toHaveLength(41_911)
  })

  it('lies within two metres of the census points (rounded to 1e-5 degrees)', () => {
    const apart = Object.entries(censusPoints).map(([zip, [lat, lng]]) => {
      const row = zips.get(zip)
      return row ? apartKm(row, { lat, lng }) : Infinity
    })
    expect(apart).toHaveLength(14)
    expect(Math.max(...apart)).toBeLessThan(0.002)
  })

  it.each([
    ['45202', 'Cincinnati', 'OH'],
    ['45402', 'Dayton', 'OH'],
    ['43215', 'Columbus', 'OH'],
    ['41011', 'Covington', 'KY'],
    ['40507', 'Lexington', 'KY'],
    ['40202', 'Louisville', 'KY'],
    ['47250', 'Madison', 'IN'],
    ['47374', 'Richmond', 'IN'],
    ['47401', 'Bloomington', 'IN'],
    ['85001', 'Phoenix', 'AZ'],
    ['99501', 'Anchorage', 'AK'],
    ['96813', 'Honolulu', 'HI'],
    ['00601', 'Adjuntas', 'PR'],
  ])('%s is %s, %s', (zip, city, state) => expect(zips.get(zip)).toMatchObject({ city, state }))

  it('knows every state it names, and no military one', () => {
    const states = new Set([...zips.values()].map((row) => row.state))
    for (const state of states) expect([state, findState(state) !== null]).toEqual([state, true])
    expect(states.size).toBe(59)
    expect([...zips.values()].every((row) => cellAt(row, 50) !== null)).toBe(true)
  })
})

describe('places by name', () => {
  it('holds 16,677 US places, the demonstration towns among them', () => {
    expect(towns).toHaveLength(16_677)
    const named = (name: string, state: string) =>
      towns.find((town) => town.name === name && town.state === state)
    expect(named('Cincinnati', 'OH')?.population).toBeGreaterThan(250_000)
    expect(named('Madison', 'IN')?.population).toBeGreaterThan(5000)
    expect(named('Washington, D.C.', 'DC')?.population).toBeGreaterThan(500_000)
  })

  it('agrees with the middle of a town’s own ZIPs (measured: median 2.8 km, 90 % within 9.0 km)', () => {
    const byTown = new Map<string, { lat: number; lng: number }[]>()
    for (const { city, state, lat, lng } of zips.values()) {
      const key = `${city.toLowerCase()},${state}`
      byTown.set(key, [...(byTown.get(key) ?? []), { lat, lng }])
    }
    const apart = towns.flatMap((town) => {
      const points = byTown.get(`${town.name.toLowerCase()},${town.state}`)
      if (!points) return []
      const mean = (pick: (point: { lat: number; lng: number }) => number) =>
        points.reduce((sum, point) => sum + pick(point), 0) / points.length
      return [apartKm(town, { lat: mean((point) => point.lat), lng: mean((point) => point.lng) })]
    })
    // The far end is two places of one name in one state; ZIP areas reach far beyond the town they are named for.
    apart.sort((one, other) => one - other)
    const at = (share: number) => apart[Math.floor(apart.length * share)] ?? Infinity
    expect(apart.length).toBeGreaterThan(11_000)
    expect([at(0.5) < 3, at(0.9) < 9.5]).toEqual([true, true])
  })
})

describe('people by cell', () => {
  const cells = rowsOf('cell-population.csv').map((row) => row.map(Number))
  const people = new Map(cells.map(([size, iy, ix, population = 0]) => [`${size}.${iy}.${ix}`, population]))
  const populationOf = (cell: { sizeThousandths: number; iy: number; ix: number }) =>
    people.get(`${cell.sizeThousandths}.${cell.iy}.${cell.ix}`) ?? 0

  it('counts the same people at both cell sizes, none of them nobody', () => {
    const total = (size: number) =>
      cells.filter((row) => row[0] === size).reduce((sum, row) => sum + (row[3] ?? 0), 0)
    expect(total(50)).toBe(total(100))
    expect(cells.every((row) => (row[3] ?? 0) > 0)).toBe(true)
  })

  it('keeps a city seller in a small cell and lets a prairie seller’s grow', () => {
    const cincinnati = zips.get('45202')
    const prairie = { lat: 47.05, lng: -107.3 }
    if (!cincinnati) throw new Error('no Cincinnati')
    expect(locationCellForSeller(cincinnati, populationOf)?.sizeThousandths).toBe(50)
    expect(locationCellForSeller(prairie, populationOf)?.sizeThousandths).toBe(200)
  })
})
