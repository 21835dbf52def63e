import { Builder, type Offset } from 'flatbuffers'

import type { Ask, AskedPlace } from './read-ask'
import { airAtHour, weatherOn, type DayWeather, type WeatherRule } from './weather'

// Field and enum numbers of the service's published schema (github.com/open-meteo/sdk, flatbuffers/*.fbs); the SDK's
// readers show them too (vtable offset = 4 + 2 × number).
const response = {
  latitude: 0,
  longitude: 1,
  elevation: 2,
  place: 4,
  offset: 6,
  zone: 7,
  daily: 10,
  hourly: 11,
}
const RESPONSE_FIELDS = 15
const block = { time: 0, timeEnd: 1, interval: 2, variables: 3 }
const BLOCK_FIELDS = 4
const series = { variable: 0, unit: 1, values: 3, altitude: 5, aggregation: 6 }
const SERIES_FIELDS = 13
const TEMPERATURE = 47
const CELSIUS = 1
const FAHRENHEIT = 9
const AGGREGATION = { temperature_2m: 0, temperature_2m_min: 1, temperature_2m_max: 2 }

const HOUR_S = 3600
const DAY_S = 86_400
const ELEVATION_M = 150

interface Series {
  name: keyof typeof AGGREGATION
  valuesC: number[]
}

function writeSeries(builder: Builder, { name, valuesC }: Series, isFahrenheit: boolean): Offset {
  builder.startVector(4, valuesC.length, 4)
  for (const airC of valuesC.toReversed()) builder.addFloat32(isFahrenheit ? airC * 1.8 + 32 : airC)
  const values = builder.endVector()
  builder.startObject(SERIES_FIELDS)
  builder.addFieldInt8(series.variable, TEMPERATURE, 0)
  builder.addFieldInt8(series.unit, isFahrenheit ? FAHRENHEIT : CELSIUS, 0)
  builder.addFieldOffset(series.values, values, 0)
  builder.addFieldInt16(series.altitude, 2, 0)
  builder.addFieldInt8(series.aggregation, AGGREGATION[name], 0)
  return builder.endObject()
}

interface Block {
  fromS: number
  untilS: number
  stepS: number
  all: Series[]
}

function writeBlock(builder: Builder, { fromS, untilS, stepS, all }: Block, isFahrenheit: boolean): Offset {
  const offsets = all.map((one) => writeSeries(builder, one, isFahrenheit))
  builder.startVector(4, offsets.length, 4)
  for (const offset of offsets.toReversed()) builder.addOffset(offset)
  const variables = builder.endVector()
  builder.startObject(BLOCK_FIELDS)
  builder.addFieldInt64(block.time, BigInt(fromS), 0n)
  builder.addFieldInt64(block.timeEnd, BigInt(untilS), 0n)
  builder.addFieldInt32(block.interval, stepS, 0)
  builder.addFieldOffset(block.variables, variables, 0)
  return builder.endObject()
}

function blocksOf(ask: Ask, place: AskedPlace, rules: readonly WeatherRule[]) {
  const fromS = Date.parse(ask.days[0] ?? '') / 1000 - place.offsetS
  const span = { fromS, untilS: fromS + ask.days.length * DAY_S }
  const weatherOf = (day: string): DayWeather => weatherOn(rules, place, day)
  const daily = ask.daily.map((name): Series => {
    const extreme = name === 'temperature_2m_min' ? 'minC' : 'maxC'
    return { name, valuesC: ask.days.map((day) => weatherOf(day)[extreme]) }
  })
  const hourly = ask.hourly.map((name): Series => {
    const dayLong = (day: string) => Array.from({ length: 24 }, (_, hour) => airAtHour(weatherOf, day, hour))
    return { name, valuesC: ask.days.flatMap(dayLong) }
  })
  return { daily: { ...span, stepS: DAY_S, all: daily }, hourly: { ...span, stepS: HOUR_S, all: hourly } }
}

/** The body for one place, its length in front, as the service's clients read it. */
export function writeReply(ask: Ask, rules: readonly WeatherRule[], at: number): Uint8Array {
  const place = ask.places[at]
  if (!place) throw new Error(`no place ${at} in this ask`)
  const builder = new Builder(4096)
  const { daily, hourly } = blocksOf(ask, place, rules)
  const zone = builder.createString(place.zone)
  const dailyAt = daily.all.length > 0 ? writeBlock(builder, daily, ask.isFahrenheit) : 0
  const hourlyAt = hourly.all.length > 0 ? writeBlock(builder, hourly, ask.isFahrenheit) : 0
  builder.startObject(RESPONSE_FIELDS)
  builder.addFieldFloat32(response.latitude, place.lat, 0)
  builder.addFieldFloat32(response.longitude, place.lng, 0)
  builder.addFieldFloat32(response.elevation, ELEVATION_M, 0)
  builder.addFieldInt64(response.place, BigInt(at), 0n)
  builder.addFieldInt32(response.offset, place.offsetS, 0)
  builder.addFieldOffset(response.zone, zone, 0)
  builder.addFieldOffset(response.daily, dailyAt, 0)
  builder.addFieldOffset(response.hourly, hourlyAt, 0)
  builder.finishSizePrefixed(builder.endObject())
  return builder.asUint8Array().slice()
}
