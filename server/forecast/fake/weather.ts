/** Kilometres. */
const EARTH_RADIUS_KM = 6371
const RADIANS = Math.PI / 180
const DAY_MS = 86_400_000

export interface Place {
  lat: number
  lng: number
}

export interface WeatherRule {
  id: string
  /** Null: everywhere. */
  where: (Place & { withinKm: number }) | null
  /** First and last day it holds for, 2027-01-15, by the calendar of the place. */
  from: string
  until: string
  minC: number
  maxC: number
}

export interface DayWeather {
  minC: number
  maxC: number
}

/** Haversine on a sphere; good to some 0.5 %. */
export function distanceKm(one: Place, other: Place): number {
  const half = (degrees: number) => Math.sin((degrees * RADIANS) / 2) ** 2
  const across =
    half(one.lat - other.lat) +
    Math.cos(one.lat * RADIANS) * Math.cos(other.lat * RADIANS) * half(one.lng - other.lng)
  return 2 * EARTH_RADIUS_KM * Math.asin(Math.min(1, Math.sqrt(across)))
}

export function dayAfter(day: string, days: number): string {
  return new Date(Date.parse(day) + days * DAY_MS).toISOString().slice(0, 10)
}

/** Mild everywhere, 10–13 and 17–21 °C, a little different by place and day, and the same at every asking. */
function mildDay({ lat, lng }: Place, day: string): DayWeather {
  const number = Date.parse(day) / DAY_MS
  const low = 0.7 * Math.sin(number * 0.7 + lat) + 0.3 * Math.sin(number * 0.31 + lng * 1.3)
  const high = 0.7 * Math.sin(number * 0.53 + lng) + 0.3 * Math.sin(number * 0.23 + lat * 1.1)
  return { minC: 11.5 + 1.5 * low, maxC: 19 + 2 * high }
}

/** The latest rule that holds for place and day wins; without one it is mild. */
export function weatherOn(rules: readonly WeatherRule[], place: Place, day: string): DayWeather {
  const holds = ({ where, from, until }: WeatherRule) =>
    from <= day && day <= until && (where === null || distanceKm(where, place) <= where.withinKm)
  return rules.findLast(holds) ?? mildDay(place, day)
}

const COLDEST_HOUR = 6
const WARMEST_HOUR = 15

/** Half a cosine from one value to the other. */
const eased = (from: number, to: number, part: number) =>
  from + ((to - from) * (1 - Math.cos(Math.PI * part))) / 2

/**
 * Air at a full hour of the day, 0 to 23: lowest at 6, highest at 15, and in the night on the way between one day
 * and the next, but never outside the day's own low and high.
 */
export function airAtHour(weatherOf: (day: string) => DayWeather, day: string, hour: number): number {
  const { minC, maxC } = weatherOf(day)
  if (hour >= COLDEST_HOUR && hour <= WARMEST_HOUR) {
    return eased(minC, maxC, (hour - COLDEST_HOUR) / (WARMEST_HOUR - COLDEST_HOUR))
  }
  const night = 24 - WARMEST_HOUR + COLDEST_HOUR
  const air =
    hour > WARMEST_HOUR
      ? eased(maxC, weatherOf(dayAfter(day, 1)).minC, (hour - WARMEST_HOUR) / night)
      : eased(weatherOf(dayAfter(day, -1)).maxC, minC, (hour + 24 - WARMEST_HOUR) / night)
  return Math.min(maxC, Math.max(minC, air))
}
