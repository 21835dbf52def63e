import type { AirDay, DesignWeather } from '@/shared/domain/climate/design-weather'
import type { SourceKey } from '@/shared/sources'

/** Forecasts err: the days are taken this much colder and hotter. House rule. */
export const FORECAST_MARGIN_C = 2
export const forecastMarginSource: SourceKey = 'house-rule'

/** A forecast is believed for the coming days up to this many; past it the weather of many years counts. House rule. */
export const FORECAST_DAYS = 7

/**
 * The cold and the hot day to judge a trip by, from the forecast days at one end, °C: the coldest night and noon of them
 * and the warmest, each with the margin. null without days.
 */
export function forecastWeather(days: readonly AirDay[]): DesignWeather | null {
  if (days.length === 0) return null
  const [mins, maxes] = [days.map((day) => day.minC), days.map((day) => day.maxC)]
  return {
    cold: { minC: Math.min(...mins) - FORECAST_MARGIN_C, maxC: Math.min(...maxes) - FORECAST_MARGIN_C },
    hot: { minC: Math.max(...mins) + FORECAST_MARGIN_C, maxC: Math.max(...maxes) + FORECAST_MARGIN_C },
  }
}
