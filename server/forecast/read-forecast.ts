import { now } from '@/server/clock'
import { askService } from '@/server/forecast/ask-service'
import { forecastSettings } from '@/server/forecast/forecast-settings'
import { judgeReply, type JudgedReply } from '@/server/forecast/judge-reply'
import { log } from '@/server/log'

export interface Forecast extends JudgedReply {
  /** Domain time. */
  readAt: Date
}

const WITHIN_MS = 3_000
const KEPT_MS = 10 * 60_000
const REST_MS = 20_000
const MOST_PLACES = 500
const DAY_MS = 86_400_000
const DAYS_AHEAD = 8
/** Lattice of places, 1/20 degree (some 5 km): neighbours share a call, and nobody's own place is told to the service. */
const CELLS_PER_DEGREE = 20

interface Kept {
  /** Null: it answered nonsense for this place. */
  forecast: Forecast | null
  untilMs: number
}

// Real time throughout: how old an answer is and how long a service rests has nothing to do with the demo's date.
const kept = new Map<string, Kept>()
const underWay = new Map<string, Promise<Forecast | null>>()
let rest = { url: '', untilMs: 0 }

/** Forgets answers and rests: tests that change the weather, or a new service. */
export function forgetForecasts(): void {
  kept.clear()
  rest = { url: '', untilMs: 0 }
}

const dayOf = (instantMs: number) => new Date(instantMs).toISOString().slice(0, 10)
const onLattice = (degrees: number) => (Math.round(degrees * CELLS_PER_DEGREE) / CELLS_PER_DEGREE).toFixed(2)

function keep(key: string, forecast: Forecast | null): void {
  kept.delete(key)
  kept.set(key, { forecast, untilMs: Date.now() + (forecast ? KEPT_MS : REST_MS) })
  const [oldest] = kept.keys()
  if (kept.size > MOST_PLACES && oldest !== undefined) kept.delete(oldest)
}

async function ask(url: string, key: string, params: Record<string, string>): Promise<Forecast | null> {
  try {
    const reply = await askService({ address: `${url}/v1/forecast`, params, withinMs: WITHIN_MS })
    const judged = judgeReply(reply)
    const forecast = judged && { ...judged, readAt: now() }
    if (!forecast) log.warn('the forecast service answered what cannot be a forecast')
    keep(key, forecast)
    if (rest.url === url) rest = { url: '', untilMs: 0 }
    return forecast
  } catch (error) {
    rest = { url, untilMs: Date.now() + REST_MS }
    log.warn({ err: error }, 'the forecast service did not answer')
    return null
  }
}

/**
 * Air at the place from yesterday to eight days ahead. Null: no service is set, or it does not answer, or answers
 * nonsense. Never throws, and takes at most some 3.5 s. `isFresh` passes over what is kept and over a rest.
 */
export async function readForecast(
  point: { lat: number; lng: number },
  options: { isFresh?: boolean } = {},
): Promise<Forecast | null> {
  const { url } = forecastSettings()
  if (url === null || !(Math.abs(point.lat) <= 90 && Math.abs(point.lng) <= 180)) return null
  const today = now().getTime()
  const params = {
    latitude: onLattice(point.lat),
    longitude: onLattice(point.lng),
    daily: 'temperature_2m_min,temperature_2m_max',
    hourly: 'temperature_2m',
    timezone: 'auto',
    start_date: dayOf(today - DAY_MS),
    end_date: dayOf(today + DAYS_AHEAD * DAY_MS),
  }
  const key = [url, params.latitude, params.longitude, params.start_date].join(' ')
  const running = underWay.get(key)
  if (running) return running
  if (!options.isFresh) {
    const known = kept.get(key)
    if (known && Date.now() < known.untilMs) return known.forecast
    if (rest.url === url && Date.now() < rest.untilMs) return null
  }
  const asked = ask(url, key, params).finally(() => underWay.delete(key))
  underWay.set(key, asked)
  return asked
}
