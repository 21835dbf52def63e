import { getGreatCircleBearing } from 'geolib'

import type { CellPoint } from '@/shared/domain/geo/location-cell'

const winds = [
  'north',
  'north-east',
  'east',
  'south-east',
  'south',
  'south-west',
  'west',
  'north-west',
] as const
export type Bearing = (typeof winds)[number]

/** Which way to set out, to the nearest of eight winds. null: both stand in the same cell. */
export function bearingWords(from: CellPoint, to: CellPoint): Bearing | null {
  if (from.lat === to.lat && from.lng === to.lng) return null
  return winds[Math.round(getGreatCircleBearing(from, to) / 45) % 8] ?? null
}
