import { usualAir } from '@/server/trips/usual-air'
import { designWeather, type DesignWeather } from '@/shared/domain/climate/design-weather'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { SEASON_CONFIDENCE } from '@/shared/domain/season/season-classes.facts'
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

async function usual(at: CellPoint, { shipDay, nights }: Way): Promise<DesignWeather | null> {
  const day = await usualAir(at, shipDay)
  return day && designWeather(day, nights, SEASON_CONFIDENCE)
}

/** The air at both ends to judge a way by. null: no station near one of them. */
export async function wayWeather(way: Way): Promise<WayWeather | null> {
  const [origin, destination] = await Promise.all([usual(way.from, way), usual(way.to, way)])
  return origin && destination ? { basis: 'long-term', weather: { origin, destination } } : null
}
