import type { WeatherRule } from './weather'

export type NewRule = Omit<WeatherRule, 'id'>
export type Typed = Record<string, string>
export type RuleErrors = Record<string, string>
export type ReadRule = { rule: NewRule } | { errors: RuleErrors }

const KM_PER_MILE = 1.609344
const COLDEST_C = -90
const HOTTEST_C = 60

const toC = (value: number, unit: string | undefined) => (unit === 'C' ? value : (value - 32) / 1.8)

const number = (text: string | undefined) => (text?.trim() ? Number(text) : NaN)

function isDay(text: string | undefined): text is string {
  return text !== undefined && /^\d{4}-\d\d-\d\d$/.test(text) && !Number.isNaN(Date.parse(text))
}

function whereOf(typed: Typed, errors: RuleErrors): NewRule['where'] {
  if (typed.where !== 'near') return null
  const [lat, lng] = [number(typed.lat), number(typed.lng)]
  const withinKm = number(typed.miles) * KM_PER_MILE
  if (!(Math.abs(lat) <= 90)) errors.lat = 'Type a latitude in degrees, like 39.1.'
  if (!(Math.abs(lng) <= 180)) errors.lng = 'Type a longitude in degrees, like -84.5 (west is negative).'
  if (!(withinKm > 0)) errors.miles = 'Type how many miles around, like 50.'
  return { lat, lng, withinKm }
}

/** What the page's form sent, or what has to be mended field by field. */
export function readTypedRule(typed: Typed): ReadRule {
  const errors: RuleErrors = {}
  const where = whereOf(typed, errors)
  const { from = '', until = '' } = typed
  if (!isDay(from)) errors.from = 'Choose the first day.'
  if (!isDay(until)) errors.until = 'Choose the last day.'
  else if (isDay(from) && until < from) errors.until = 'The last day is before the first. Choose a later one.'
  const minC = toC(number(typed.low), typed.unit)
  const maxC = toC(number(typed.high), typed.unit)
  const isAir = (airC: number) => airC >= COLDEST_C && airC <= HOTTEST_C
  if (!isAir(minC)) errors.low = 'Type a temperature between -130 and 140 °F (-90 and 60 °C).'
  if (!isAir(maxC)) errors.high = 'Type a temperature between -130 and 140 °F (-90 and 60 °C).'
  else if (isAir(minC) && maxC < minC) errors.high = 'The high is below the low. Type a higher one.'
  return Object.keys(errors).length > 0 ? { errors } : { rule: { where, from, until, minC, maxC } }
}

/** The same as JSON: `{ where?: { lat, lng, withinKm }, from, until, minC, maxC }`. */
export function readJsonRule(body: unknown): ReadRule {
  const given = (body ?? {}) as Record<string, unknown>
  const near = given.where as Record<string, unknown> | null | undefined
  const text = (value: unknown) =>
    typeof value === 'number' || typeof value === 'string' ? String(value) : ''
  const read = readTypedRule({
    ...(near
      ? { where: 'near', lat: text(near.lat), lng: text(near.lng), miles: text(near.withinKm) }
      : { where: 'everywhere' }),
    ...{ from: text(given.from), until: text(given.until) },
    ...{ low: text(given.minC), high: text(given.maxC), unit: 'C' },
  })
  if ('errors' in read || !near) return read
  const { where } = read.rule
  return { rule: { ...read.rule, where: where && { ...where, withinKm: Number(near.withinKm) } } }
}

/** In words: where a rule holds. */
export function whereWords({ where }: NewRule): string {
  if (!where) return 'Everywhere'
  const miles = Math.round((where.withinKm / KM_PER_MILE) * 10) / 10
  return `Within ${miles} miles of ${where.lat}, ${where.lng}`
}
