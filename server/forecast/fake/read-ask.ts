import { dayAfter, type Place } from './weather'
import { offsetOf, zoneAt } from './zone-of'

export type DailyName = 'temperature_2m_max' | 'temperature_2m_min'

export interface AskedPlace extends Place {
  zone: string
  offsetS: number
}

export interface Ask {
  places: AskedPlace[]
  daily: DailyName[]
  hourly: 'temperature_2m'[]
  days: string[]
  isFahrenheit: boolean
}

/** The ask is wrong; its message is the `reason` of the 400. */
export class WrongAsk extends Error {}

const MOST_DAYS = 16
const MOST_PLACES = 100
const DAYS_UNASKED = 7
const DAY_MS = 86_400_000

function listOf(query: URLSearchParams, name: string): string[] {
  return query.getAll(name).flatMap((text) => text.split(',').filter(Boolean))
}

function namesOf<N extends string>(query: URLSearchParams, name: string, known: readonly N[]): N[] {
  return listOf(query, name).map((asked) => {
    const found = known.find((one) => one === asked)
    if (!found) throw new WrongAsk(`Practice weather has no ${name} variable '${asked}'.`)
    return found
  })
}

function degrees(query: URLSearchParams, name: string, most: number): number[] {
  const read = listOf(query, name).map(Number)
  if (read.some((value) => !(Math.abs(value) <= most))) {
    throw new WrongAsk(`Parameter '${name}' must be in range of -${most} to ${most}°.`)
  }
  return read
}

function dayIn(query: URLSearchParams, name: string, otherwise: string): string {
  const text = query.get(name) ?? otherwise
  const isDay = /^\d{4}-\d\d-\d\d$/.test(text) && new Date(`${text}T00:00Z`).toJSON()?.startsWith(text)
  if (!isDay) throw new WrongAsk(`Parameter '${name}' must be a date like 2027-01-15.`)
  return text
}

function daysOf(query: URLSearchParams, now: Date): string[] {
  const from = dayIn(query, 'start_date', now.toISOString().slice(0, 10))
  const until = dayIn(query, 'end_date', dayAfter(from, DAYS_UNASKED - 1))
  const count = Math.round((Date.parse(until) - Date.parse(from)) / DAY_MS) + 1
  if (count < 1) throw new WrongAsk("Parameter 'end_date' must not be before 'start_date'.")
  if (count > MOST_DAYS) throw new WrongAsk(`At most ${MOST_DAYS} days can be asked for; these are ${count}.`)
  return Array.from({ length: count }, (_, at) => dayAfter(from, at))
}

function placesOf(query: URLSearchParams, now: Date): AskedPlace[] {
  const lats = degrees(query, 'latitude', 90)
  const lngs = degrees(query, 'longitude', 180)
  if (lats.length === 0 || lats.length !== lngs.length || lats.length > MOST_PLACES) {
    throw new WrongAsk(`Parameters 'latitude' and 'longitude' must name 1 to ${MOST_PLACES} places alike.`)
  }
  const zones = listOf(query, 'timezone')
  return lats.map((lat, at) => {
    const place = { lat, lng: lngs[at] ?? 0 }
    const named = zones[at] ?? zones[0] ?? 'GMT'
    const zone = named === 'auto' ? zoneAt(place) : named
    const offsetS = offsetOf(zone, now)
    if (offsetS === null) throw new WrongAsk(`Invalid timezone '${zone}'.`)
    return { ...place, zone, offsetS }
  })
}

/** Reads the query of GET /v1/forecast; throws WrongAsk. `now` gives the UTC offset in force, and today. */
export function readAsk(query: URLSearchParams, now: Date): Ask {
  if (query.get('format') !== 'flatbuffers') {
    throw new WrongAsk("Practice weather speaks only 'format=flatbuffers'.")
  }
  return {
    places: placesOf(query, now),
    daily: namesOf(query, 'daily', ['temperature_2m_min', 'temperature_2m_max']),
    hourly: namesOf(query, 'hourly', ['temperature_2m']),
    days: daysOf(query, now),
    isFahrenheit: query.get('temperature_unit') === 'fahrenheit',
  }
}
