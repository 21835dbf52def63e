import type { AirDay } from '@/shared/domain/climate/design-weather'

export type Side = 'cold' | 'hot'

/** °C between minimum and maximum of every level's day: of all single spans the one that costs least, US-wide. */
const DAY_SPAN_C = 12
/** Ends of the scales, °C: of the coldest hour of cold days, of the warmest hour of hot days. */
const scaleC = { cold: [-45, 35], hot: [-20, 60] } as const

/** Steps of one degree on the scale of cold or hot days, 0 the harshest. */
export const LEVELS = 81

/** The day a level stands for, °C. */
export function dayOfLevel(side: Side, level: number): AirDay {
  const [from, to] = scaleC[side]
  return side === 'cold'
    ? { minC: from + level, maxC: from + level + DAY_SPAN_C }
    : { minC: to - level - DAY_SPAN_C, maxC: to - level }
}

/** The mildest level no milder than this day, by minimum and by maximum. null: harsher than the scale. */
export function levelOfDay(side: Side, { minC, maxC }: AirDay): number | null {
  const [from, to] = scaleC[side]
  const level =
    side === 'cold'
      ? Math.floor(Math.min(minC, maxC - DAY_SPAN_C)) - from
      : to - Math.ceil(Math.max(maxC, minC + DAY_SPAN_C))
  return level < 0 ? null : Math.min(LEVELS - 1, level)
}
