import type { ZipName } from '@/seed/places/place-packages'

export interface ZipRow {
  zip: string
  city: string
  state: string
  lat: number
  lng: number
}

type Points = Record<string, { latitude: number; longitude: number }>

const military = new Set(['AA', 'AE', 'AP'])

/**
 * Census points where there are any, the name list's own elsewhere; military ZIPs and those without a place dropped.
 * A ZIP younger than the name list takes city and state of the nearest ZIP that has them.
 */
export function mergeZips(points: Points, names: readonly ZipName[]): ZipRow[] {
  const named = names
    .filter(({ country, state }) => country === 'US' && !military.has(state))
    .map(({ zip, city, state, latitude, longitude }): ZipRow => {
      const point = points[zip] ?? { latitude, longitude }
      return { zip, city, state, lat: point.latitude, lng: point.longitude }
    })
    .filter(({ lat, lng }) => lat !== 0 || lng !== 0)
  const known = new Set(named.map((row) => row.zip))
  const young = Object.entries(points)
    .filter(([zip]) => !known.has(zip))
    .map(([zip, { latitude, longitude }]): ZipRow => {
      const { city, state } = nearest(named, latitude, longitude)
      return { zip, city, state, lat: latitude, lng: longitude }
    })
  return [...named, ...young].sort((one, other) => one.zip.localeCompare(other.zip, 'en'))
}

function nearest(rows: readonly ZipRow[], lat: number, lng: number): ZipRow {
  const shrink = Math.cos((lat * Math.PI) / 180)
  const apart = (row: ZipRow) => (row.lat - lat) ** 2 + ((row.lng - lng) * shrink) ** 2
  return rows.reduce((best, row) => (apart(row) < apart(best) ? row : best))
}
