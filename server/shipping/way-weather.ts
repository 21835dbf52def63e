import { now } from '@/server/clock'
import { readForecast, type Forecast } from '@/server/forecast/read-forecast'
import { usualAir } from '@/server/trips/usual-air'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { designWeather, type DesignWeather } from '@/shared/domain/climate/design-weather'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { SEASON_CONFIDENCE } from '@/shared/domain/season/season-classes.facts'
import { FORECAST_DAYS, forecastWeather } from '@/shared/domain/shipping/forecast-weather'
import type { Weather } from '@/shared/domain/transport/leg-air'

export interface Way {
  from: CellPoint
  to: CellPoint
  /** 'YYYY-MM-DD', seller's calendar. */
  shipDay: string
  nights: number
  /** Ask the forecast anew. */
  isFresh: boolean
}

export interface WayWeather {
  basis: 'forecast' | 'long-term'
  weather: Weather
}

/** From the day the box leaves to the day it arrives. */
const daysOf = ({ shipDay, nights }: Way) =>
  Array.from({ length: nights + 1 }, (_, gone) => dateAfter(shipDay, gone))

const isNear = ({ shipDay }: Way) => shipDay <= dateAfter(now().toISOString().slice(0, 10), FORECAST_DAYS)

function weatherOn(forecast: Forecast | null, days: readonly string[]): DesignWeather | null {
  const found = days.map((day) => forecast?.days.find((one) => one.day === day))
  return found.every((one) => one !== undefined) ? forecastWeather(found) : null
}

async function forecastAt(at: CellPoint, way: Way): Promise<DesignWeather | null> {
  const days = daysOf(way)
  const forecast = await readForecast(at, { isFresh: way.isFresh })
  const known = weatherOn(forecast, days)
  // An answer kept from before the day turned may end too early.
  if (known || !forecast || way.isFresh) return known
  return weatherOn(await readForecast(at, { isFresh: true }), days)
}

async function usual(at: CellPoint, { shipDay, nights }: Way): Promise<DesignWeather | null> {
  const day = await usualAir(at, shipDay)
  return day && designWeather(day, nights, SEASON_CONFIDENCE)
}

async function bothEnds(
  way: Way,
  read: (at: CellPoint, way: Way) => Promise<DesignWeather | null>,
): Promise<Weather | null> {
  const [origin, destination] = await Promise.all([read(way.from, way), read(way.to, way)])
  return origin && destination ? { origin, destination } : null
}

/**
 * The air at both ends to judge a way by: the forecast within 7 days, where it answers for both ends and every day; else
 * the weather of many years. null: no station near one of them either.
 */
export async function wayWeather(way: Way): Promise<WayWeather | null> {
  const forecast = isNear(way) ? await bothEnds(way, forecastAt) : null
  if (forecast) return { basis: 'forecast', weather: forecast }
  const weather = await bothEnds(way, usual)
  return weather ? { basis: 'long-term', weather } : null
}
