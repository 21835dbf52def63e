import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'

import { fetchWeatherApi } from 'openmeteo'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { setClockOffset } from '@/server/clock'
import { startForecast, type RunningForecast } from '@/server/forecast/fake/start-fake'
import { configureForecast } from '@/server/forecast/forecast-settings'
import { forgetForecasts, readForecast } from '@/server/forecast/read-forecast'
import { log } from '@/server/log'

const NEW_YORK = { lat: 40.71, lng: -74.01 }
const PHOENIX = { lat: 33.45, lng: -112.07 }
const HOUR_MS = 3_600_000
const TENTH_C = 0.05

let service: RunningForecast

/** The domain and the service both believe it is that moment. */
async function openAt(instant: string): Promise<void> {
  const clockOffsetMs = Date.parse(instant) - Date.now()
  setClockOffset(clockOffsetMs)
  service = await startForecast({ clockOffsetMs })
  configureForecast({ url: `${service.url}/` })
  forgetForecasts()
}

beforeEach(() => {
  log.level = 'silent'
})
afterEach(async () => {
  vi.useRealTimers()
  configureForecast({ url: null })
  await service.stop()
})

const localDay = (at: Date, zone: string) => new Intl.DateTimeFormat('en-CA', { timeZone: zone }).format(at)

describe('a forecast that the service gives', () => {
  beforeEach(() => openAt('2027-01-15T15:00:00Z'))

  it('is what was set, to a tenth of a degree, for each of two places', async () => {
    service.setWeather({ from: '2027-01-16', until: '2027-01-16', minC: -14.3, maxC: -2.8 })
    const where = { ...PHOENIX, withinKm: 30 }
    service.setWeather({ where, from: '2027-01-16', until: '2027-01-17', minC: 4.4, maxC: 19.6 })
    const [east, west] = await Promise.all([readForecast(NEW_YORK), readForecast(PHOENIX)])
    const on = (day: string, forecast: typeof east) => forecast?.days.find((one) => one.day === day)
    expect(Math.abs((on('2027-01-16', east)?.minC ?? NaN) + 14.3)).toBeLessThan(TENTH_C)
    expect(Math.abs((on('2027-01-16', east)?.maxC ?? NaN) + 2.8)).toBeLessThan(TENTH_C)
    expect(Math.abs((on('2027-01-16', west)?.minC ?? NaN) - 4.4)).toBeLessThan(TENTH_C)
    expect(Math.abs((on('2027-01-17', west)?.maxC ?? NaN) - 19.6)).toBeLessThan(TENTH_C)
    expect(on('2027-01-17', east)?.minC).toBeGreaterThan(9.9)
    expect(east?.zone).toBe('America/New_York')
    expect(west?.zone).toBe('America/Phoenix')
    // 3 pm in New York is 20:00 UTC in winter, and 22:00 in Phoenix.
    const airAt = (forecast: typeof east, at: string) =>
      forecast?.hours.find((hour) => hour.at.toISOString() === at)?.airC ?? NaN
    expect(Math.abs(airAt(east, '2027-01-16T20:00:00.000Z') + 2.8)).toBeLessThan(TENTH_C)
    expect(Math.abs(airAt(west, '2027-01-16T22:00:00.000Z') - 19.6)).toBeLessThan(TENTH_C)
  })

  it('reaches from yesterday to eight days ahead by the calendar of the place', async () => {
    const [east, west] = await Promise.all([readForecast(NEW_YORK), readForecast(PHOENIX)])
    for (const forecast of [east, west]) {
      expect(forecast?.days).toHaveLength(10)
      expect(forecast?.days[0]?.day).toBe('2027-01-14')
      expect(forecast?.days[9]?.day).toBe('2027-01-23')
      const hours = forecast?.hours ?? []
      expect(hours).toHaveLength(240)
      expect(hours.map(({ at }) => localDay(at, forecast?.zone ?? ''))).toEqual(
        forecast?.days.flatMap(({ day }) => Array.from({ length: 24 }, () => day)),
      )
    }
    expect(Math.abs((east?.readAt.getTime() ?? 0) - Date.parse('2027-01-15T15:00:00Z'))).toBeLessThan(60_000)
  })

  it('is asked for once by all who want it at once, kept, and asked for anew on wish', async () => {
    const [one, two] = await Promise.all([
      readForecast(NEW_YORK),
      readForecast({ lat: NEW_YORK.lat + 0.01, lng: NEW_YORK.lng }),
    ])
    expect(one).not.toBeNull()
    expect(two).toBe(one)
    expect(await readForecast(NEW_YORK)).toBe(one)
    expect(service.asked()).toBe(1)
    service.setWeather({ from: '2027-01-15', until: '2027-01-15', minC: -20, maxC: -10 })
    expect(await readForecast(NEW_YORK)).toBe(one)
    expect((await readForecast(NEW_YORK, { isFresh: true }))?.days[1]?.minC).toBe(-20)
    expect((await readForecast(NEW_YORK))?.days[1]?.minC).toBe(-20)
    expect(service.asked()).toBe(2)
    vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + 10 * 60_000 + 1 })
    await readForecast(NEW_YORK)
    expect(service.asked()).toBe(3)
  })

  it('is decoded by the client just as it was asked for: order, several places, Fahrenheit, reasons', async () => {
    service.setWeather({ from: '2027-01-15', until: '2027-01-15', minC: -10, maxC: 20 })
    const address = `${service.url}/v1/forecast`
    const asked = {
      latitude: [NEW_YORK.lat, PHOENIX.lat],
      longitude: [NEW_YORK.lng, PHOENIX.lng],
      daily: ['temperature_2m_max', 'temperature_2m_min'],
      temperature_unit: 'fahrenheit',
      timezone: 'auto',
      start_date: '2027-01-15',
      end_date: '2027-01-15',
    }
    const replies = await fetchWeatherApi(address, asked)
    expect(replies.map((one) => [one.locationId(), one.timezone()])).toEqual([
      [0n, 'America/New_York'],
      [1n, 'America/Phoenix'],
    ])
    for (const reply of replies) {
      const series = [0, 1].map((at) => reply.daily()?.variables(at))
      expect(series.map((one) => [...(one?.valuesArray() ?? [])])).toEqual([[68], [14]])
      // Aggregation: 2 maximum, 1 minimum; unit: 9 Fahrenheit; variable: 47 temperature.
      expect(
        series.map((one) => [one?.aggregation(), one?.unit(), one?.variable(), one?.altitude()]),
      ).toEqual([
        [2, 9, 47, 2],
        [1, 9, 47, 2],
      ])
      expect(reply.hourly()).toBeNull()
    }
    const tooLong = { ...asked, end_date: '2027-02-01' }
    await expect(fetchWeatherApi(address, tooLong)).rejects.toThrow('At most 16 days')
  })
})

// The real service cuts all days at the one UTC offset in force while it answers (see fake/zone-of.ts), and so does
// the practice one. A day on which the clocks change therefore has 24 hours, not 23 or 25, and the days after it begin
// at 1:00 (spring) or 23:00 (autumn) by the wall clock. Instants stay right, and each day keeps its own name.
describe('a forecast over a change of the clocks', () => {
  it.each([
    ['2027-03-12T15:00:00Z', '2027-03-14', '2027-03-15T05:00:00.000Z'],
    ['2027-11-05T15:00:00Z', '2027-11-07', '2027-11-08T04:00:00.000Z'],
  ])('asked for at %s names %s and its neighbours once each', async (instant, changeDay, nextBegins) => {
    await openAt(instant)
    service.setWeather({ from: changeDay, until: changeDay, minC: -9, maxC: -1 })
    const forecast = await readForecast(NEW_YORK)
    const names = forecast?.days.map(({ day }) => day) ?? []
    expect(new Set(names).size).toBe(10)
    const at = names.indexOf(changeDay)
    expect(at).toBe(3)
    const begins = forecast?.hours[(at + 1) * 24]?.at
    expect(begins?.toISOString()).toBe(nextBegins)
    const ofDay = forecast?.hours.slice(at * 24, (at + 1) * 24).map(({ airC }) => airC) ?? []
    expect([Math.min(...ofDay), Math.max(...ofDay)]).toEqual([-9, -1])
    const gaps = forecast?.hours.slice(1).map((hour, i) => +hour.at - +(forecast.hours[i]?.at ?? 0))
    expect(new Set(gaps)).toEqual(new Set([HOUR_MS]))
  })
})

describe('a service that does not give one', () => {
  beforeEach(() => openAt('2027-01-15T15:00:00Z'))

  it.each(['refuses', 'objects', 'hangs'] as const)(
    'leads to null within four seconds when it %s, rests, and is asked again after 20 s',
    async (mode) => {
      service.setMode(mode)
      const began = Date.now()
      expect(await readForecast(NEW_YORK)).toBeNull()
      expect(Date.now() - began).toBeLessThan(4_000)
      const asked = service.asked()
      expect(asked).toBe(mode === 'refuses' ? 2 : 1)
      service.setMode('normal')
      expect(await readForecast(PHOENIX)).toBeNull()
      expect(service.asked()).toBe(asked)
      vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + 20_001 })
      expect(await readForecast(PHOENIX)).not.toBeNull()
      expect(service.asked()).toBe(asked + 1)
    },
  )

  it('is asked during its rest by whoever wants it fresh, and that ends the rest', async () => {
    service.setMode('objects')
    expect(await readForecast(NEW_YORK)).toBeNull()
    service.setMode('normal')
    expect(await readForecast(NEW_YORK, { isFresh: true })).not.toBeNull()
    expect(await readForecast(PHOENIX)).not.toBeNull()
  })

  it('takes nothing from places that it gave before', async () => {
    const before = await readForecast(NEW_YORK)
    service.setMode('refuses')
    expect(await readForecast(PHOENIX)).toBeNull()
    expect(await readForecast(NEW_YORK)).toBe(before)
  })

  it('leads to null for the place alone when its values cannot be air', async () => {
    service.setWeather({
      where: { ...NEW_YORK, withinKm: 20 },
      from: '2027-01-15',
      until: '2027-01-15',
      minC: -61,
      maxC: 0,
    })
    expect(await readForecast(NEW_YORK)).toBeNull()
    expect(await readForecast(NEW_YORK)).toBeNull()
    expect(service.asked()).toBe(1)
    expect(await readForecast(PHOENIX)).not.toBeNull()
  })

  it('may be gone, not set, or asked for a place that is none', async () => {
    configureForecast({ url: 'http://127.0.0.1:9' })
    expect(await readForecast(NEW_YORK)).toBeNull()
    configureForecast({ url: null })
    expect(await readForecast(NEW_YORK, { isFresh: true })).toBeNull()
    configureForecast({ url: service.url })
    expect(await readForecast({ lat: NaN, lng: 0 })).toBeNull()
    expect(await readForecast({ lat: 91, lng: 0 })).toBeNull()
    expect(service.asked()).toBe(0)
  })
})

describe('a service that is none', () => {
  const length = (bytes: number) => Buffer.from(Int32Array.of(bytes).buffer)
  it.each([
    ['nothing', Buffer.alloc(0)],
    ['a page', Buffer.from('<!doctype html><title>Sign in to this network</title>'.repeat(20))],
    ['zeros', Buffer.alloc(400)],
    ['a length that ends beyond it', Buffer.concat([length(500), Buffer.alloc(60, 7)])],
    ['far too much', Buffer.alloc(3_000_000, 1)],
    ['a length that leads back to itself', Buffer.concat([length(-4), Buffer.alloc(60, 7)])],
    ['a length far below nothing', Buffer.concat([length(-2_147_483_648), Buffer.alloc(60, 255)])],
    ['bytes of no meaning', Buffer.from(Array.from({ length: 999 }, (_, at) => (at * 151 + 77) % 256))],
  ])('leads to null within four seconds when it answers %s, and the next ask works', async (_what, body) => {
    await openAt('2027-01-15T15:00:00Z')
    const stranger = createServer((_request, response) => response.end(body)).listen(0, '127.0.0.1')
    await new Promise((done) => stranger.once('listening', done))
    configureForecast({ url: `http://127.0.0.1:${(stranger.address() as AddressInfo).port}` })
    // The server's own thread stays free meanwhile: a timer of 50 ms comes within a second.
    const began = Date.now()
    const answer = readForecast(NEW_YORK)
    await new Promise((done) => setTimeout(done, 50))
    expect(Date.now() - began).toBeLessThan(1_000)
    expect(await answer).toBeNull()
    expect(Date.now() - began).toBeLessThan(4_000)
    configureForecast({ url: service.url })
    expect(await readForecast(NEW_YORK)).not.toBeNull()
    stranger.closeAllConnections()
    stranger.close()
  })
})

describe('a reply damaged on its way', () => {
  it('leads to null or to air that can be, for each of 200 damages, and to nothing else', async () => {
    await openAt('2027-01-15T15:00:00Z')
    const days = { start_date: '2027-01-14', end_date: '2027-01-23', timezone: 'auto', format: 'flatbuffers' }
    const asked = { daily: 'temperature_2m_min,temperature_2m_max', hourly: 'temperature_2m', ...days }
    const query = new URLSearchParams({ latitude: '40.70', longitude: '-74.00', ...asked })
    const whole = Buffer.from(await (await fetch(`${service.url}/v1/forecast?${query}`)).arrayBuffer())
    let damages = 0
    const stranger = createServer((_request, response) => {
      const body = Buffer.from(whole)
      damages += 1
      // Spread over the whole reply; the frame's length is left as it is, so that the damage reaches the client.
      for (let at = 4 + (damages % 9); at < body.length; at += 97) body[at] = (body[at] ?? 0) ^ (damages * 37)
      response.end(damages === 1 ? whole : body)
    }).listen(0, '127.0.0.1')
    await new Promise((done) => stranger.once('listening', done))
    configureForecast({ url: `http://127.0.0.1:${(stranger.address() as AddressInfo).port}` })
    expect(await readForecast(NEW_YORK, { isFresh: true })).not.toBeNull()
    let refused = 0
    while (damages <= 200) {
      const forecast = await readForecast(NEW_YORK, { isFresh: true })
      if (forecast === null) refused += 1
      const air = forecast?.hours.map(({ airC }) => airC) ?? []
      expect(air.every((airC) => Math.abs(airC) <= 60)).toBe(true)
    }
    expect(refused).toBeGreaterThan(0)
    stranger.closeAllConnections()
    stranger.close()
  })
})

describe('the page of the practice weather', () => {
  beforeEach(() => openAt('2027-01-15T15:00:00Z'))
  const form = (fields: Record<string, string>) =>
    ({ method: 'POST', body: new URLSearchParams(fields), redirect: 'manual' }) as const
  const json = (method: string, body: object) => ({
    method,
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify(body),
  })
  const cold = {
    where: 'everywhere',
    from: '2027-01-15',
    until: '2027-01-15',
    low: '5',
    high: '23',
    unit: 'F',
  }
  const today = async () => (await readForecast(NEW_YORK, { isFresh: true }))?.days[1]

  it('sets weather that the product then reads, and removes it', async () => {
    expect((await fetch(`${service.url}/rules`, form(cold))).status).toBe(303)
    expect(await today()).toEqual({ day: '2027-01-15', minC: -15, maxC: -5 })
    const page = await (await fetch(service.url)).text()
    const remove = /action="(\/rules\/[\w-]+\/remove)"/.exec(page)?.[1]
    expect(page).toContain('5 °F (-15 °C) to 23 °F (-5 °C)')
    expect((await fetch(`${service.url}${remove}`, form({}))).status).toBe(303)
    expect((await today())?.minC).toBeGreaterThan(9.9)
  })

  it('gives a form back with what is wrong in it, and sets nothing', async () => {
    const answer = await fetch(`${service.url}/rules`, form({ ...cold, high: '4' }))
    expect(answer.status).toBe(422)
    expect(await answer.text()).toContain('The high is below the low.')
    expect((await today())?.minC).toBeGreaterThan(9.9)
  })

  it('takes the same as JSON', async () => {
    const rule = { from: '2027-01-15', until: '2027-01-15', minC: -7, maxC: 3 }
    expect((await fetch(`${service.url}/rules`, json('POST', rule))).status).toBe(201)
    expect(await today()).toEqual({ day: '2027-01-15', minC: -7, maxC: 3 })
    expect((await fetch(`${service.url}/rules`, { method: 'DELETE' })).status).toBe(200)
    expect((await today())?.minC).toBeGreaterThan(9.9)
    expect((await fetch(`${service.url}/mode`, json('POST', { mode: 'objects' }))).status).toBe(200)
    expect(await today()).toBeUndefined()
    expect((await fetch(`${service.url}/mode`, json('POST', { mode: 'sulks' }))).status).toBe(422)
    expect((await fetch(`${service.url}/healthz`)).status).toBe(200)
  })

  it('takes nothing from a page elsewhere', async () => {
    const foreign = { ...json('POST', { mode: 'hangs' }) }
    const headers = { ...foreign.headers, 'sec-fetch-site': 'cross-site' }
    expect((await fetch(`${service.url}/mode`, { ...foreign, headers })).status).toBe(403)
    expect(await today()).toBeDefined()
  })
})
