import { weatherPage } from './page'
import { readAsk, WrongAsk } from './read-ask'
import { readJsonRule, readTypedRule, type RuleErrors, type Typed } from './read-rule'
import { styleHash } from './style'
import { dayAfter } from './weather'
import { modes, type Mode, type WeatherBook } from './weather-book'
import { writeReply } from './write-reply'

export interface Incoming {
  method: string
  url: URL
  body: string
  isJson: boolean
}

export interface Answer {
  status: number
  headers: Record<string, string>
  body: string | Uint8Array
}

export interface Desk {
  book: WeatherBook
  now: () => Date
}

const json = (status: number, told: unknown): Answer => ({
  status,
  headers: { 'content-type': 'application/json' },
  body: JSON.stringify(told),
})
const objection = (reason: string): Answer => json(400, { error: true, reason })
const back: Answer = { status: 303, headers: { location: '/' }, body: '' }
const nothing: Answer = { status: 404, headers: { 'content-type': 'text/plain' }, body: 'Nothing here' }

function page({ book, now }: Desk, typed: Typed = {}, errors: RuleErrors = {}): Answer {
  const today = now().toISOString().slice(0, 10)
  const begun = { where: 'everywhere', from: today, until: dayAfter(today, 7), unit: 'F', miles: '50' }
  return {
    status: Object.keys(errors).length > 0 ? 422 : 200,
    headers: {
      'content-type': 'text/html; charset=utf-8',
      'content-security-policy': `default-src 'none'; style-src 'sha256-${styleHash}'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'`,
    },
    body: weatherPage({ rules: book.rules(), mode: book.mode(), typed: { ...begun, ...typed }, errors }),
  }
}

/** Null: no answer, the line stays open. */
function forecast({ book, now }: Desk, url: URL): Answer | null {
  if (book.mode() === 'hangs') return null
  if (book.mode() === 'refuses') return json(500, { error: true, reason: 'The practice forecast refuses.' })
  if (book.mode() === 'objects') return objection('The practice forecast objects to every ask.')
  try {
    const ask = readAsk(url.searchParams, now())
    const bodies = ask.places.map((_, at) => writeReply(ask, book.rules(), at))
    return {
      status: 200,
      headers: { 'content-type': 'application/octet-stream' },
      body: Buffer.concat(bodies),
    }
  } catch (error) {
    if (error instanceof WrongAsk) return objection(error.message)
    throw error
  }
}

function bodyOf({ body, isJson }: Incoming): unknown {
  if (!isJson) return Object.fromEntries(new URLSearchParams(body))
  try {
    return JSON.parse(body)
  } catch {
    return null
  }
}

function addRule(desk: Desk, incoming: Incoming): Answer {
  const given = bodyOf(incoming)
  const read = incoming.isJson ? readJsonRule(given) : readTypedRule(given as Typed)
  if ('errors' in read) {
    return incoming.isJson ? json(422, read) : page(desk, given as Typed, read.errors)
  }
  const rule = desk.book.add(read.rule)
  return incoming.isJson ? json(201, rule) : back
}

function setMode(desk: Desk, incoming: Incoming): Answer {
  const { mode } = (bodyOf(incoming) ?? {}) as { mode?: string }
  const known: Mode | undefined = modes.find((one) => one === mode)
  if (!known) return json(422, { errors: { mode: `One of: ${modes.join(', ')}` } })
  desk.book.setMode(known)
  return incoming.isJson ? json(200, { mode: known }) : back
}

/** Null: the caller gets no answer, the line stays open. */
export function answerTo(desk: Desk, incoming: Incoming): Answer | null {
  const { method, url } = incoming
  const asked = `${method} ${url.pathname}`
  if (asked === 'GET /v1/forecast') return forecast(desk, url)
  if (asked === 'GET /') return page(desk)
  if (asked === 'GET /healthz') return { status: 200, headers: { 'content-type': 'text/plain' }, body: 'ok' }
  if (asked === 'POST /rules') return addRule(desk, incoming)
  if (asked === 'POST /mode') return setMode(desk, incoming)
  if (asked === 'DELETE /rules' || asked === 'POST /rules/clear') {
    desk.book.clear()
    return method === 'DELETE' ? json(200, { rules: [] }) : back
  }
  const removed = method === 'POST' ? /^\/rules\/([\w-]+)\/remove$/.exec(url.pathname)?.[1] : undefined
  if (removed === undefined) return nothing
  desk.book.remove(removed)
  return back
}
