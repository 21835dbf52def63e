import { airOfHourC } from '@/shared/domain/climate/day-curve'
import type { DesignWeather } from '@/shared/domain/climate/design-weather'
import type { SourceKey } from '@/shared/sources'

export type Exposure = 'outdoor' | 'depot' | 'van' | 'cabin' | 'parked-car'

/** A stretch of the way: weather of one end, or one known air temperature. */
export type Leg =
  { hours: number; exposure: Exposure; end: 'origin' | 'destination' } | { hours: number; airC: number }

export interface Weather {
  origin: DesignWeather
  destination: DesignWeather
}

export const parkedCarSources: readonly SourceKey[] = ['grundstein-2010', 'mclaren-2005']

/** Warmer than outside in the hot case, °C: a closed car after an hour in the sun as measured, the rest house rules. */
const hotterInside: Readonly<Record<Exposure, number>> = {
  outdoor: 0,
  depot: 5,
  van: 8,
  cabin: 0,
  'parked-car': 26,
}
/** House rule: people in the car keep its air between these. */
const CABIN_C = [18, 26] as const

/** Air around the container on a leg at an hour of the day, °C, in the cold or the hot case. null: no weather known. */
export function legAirC(
  leg: Leg,
  at: { weather: Weather | null; side: 'cold' | 'hot'; hour: number },
): number | null {
  if ('airC' in leg) return leg.airC
  if (!at.weather) return null
  const outsideC = airOfHourC(at.weather[leg.end][at.side], at.hour)
  if (leg.exposure === 'cabin') return Math.min(CABIN_C[1], Math.max(CABIN_C[0], outsideC))
  return outsideC + (at.side === 'hot' ? hotterInside[leg.exposure] : 0)
}
