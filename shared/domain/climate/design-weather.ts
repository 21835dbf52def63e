import { normalQuantile } from '@/shared/domain/climate/normal-quantile'
import type { NormalDay } from '@/shared/domain/climate/normal-day'
import { chanceOfOneNight } from '@/shared/domain/climate/window-chance'

/** Lowest and highest air of a day, °C. */
export interface AirDay {
  minC: number
  maxC: number
}

/** The cold day and the hot day a trip is judged by. */
export interface DesignWeather {
  cold: AirDay
  hot: AirDay
}

/** The spread of minima comes true with this factor, that of maxima as tabled (counts of NOAA stations). */
const MINIMUM_SPREAD = 1.1

/**
 * The days that only 1 − `confidence` of such trips pass, over all their nights together. In the cold case the whole day
 * is cold, in the hot case the whole day is hot: stricter than a cold night before a hot noon. null unless the
 * confidence is at least one half and below 1.
 */
export function designWeather(day: NormalDay, nights: number, confidence: number): DesignWeather | null {
  if (!(confidence >= 0.5)) return null
  const low = normalQuantile(chanceOfOneNight(1 - confidence, nights))
  if (low === null) return null
  const [minimum, maximum] = [low * day.sdMinC * MINIMUM_SPREAD, low * day.sdMaxC]
  return {
    cold: { minC: day.minC + minimum, maxC: Math.max(day.minC + minimum, day.maxC + maximum) },
    hot: { minC: Math.min(day.minC - minimum, day.maxC - maximum), maxC: day.maxC - maximum },
  }
}
