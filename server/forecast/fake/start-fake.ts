import { createServer, type IncomingMessage, type ServerResponse } from 'node:http'
import type { AddressInfo } from 'node:net'

import { answerTo, type Answer, type Desk } from './answer'
import type { NewRule } from './read-rule'
import { openWeatherBook, type Mode } from './weather-book'

const HOST = '127.0.0.1'
const LONGEST_BODY_BYTES = 65_536

export interface RunningForecast {
  url: string
  /** The latest rule wins. `where` left out or null: everywhere. */
  setWeather: (rule: Omit<NewRule, 'where'> & { where?: NewRule['where'] }) => void
  clearWeather: () => void
  setMode: (mode: Mode) => void
  /** How often it was asked for a forecast. */
  asked: () => number
  stop: () => Promise<void>
}

export interface ForecastWish {
  /** Left out: one that is free. */
  port?: number
  clockOffsetMs?: number
  /** Left out: nothing is kept. */
  weatherFile?: string
}

async function bodyOf(request: IncomingMessage): Promise<string | null> {
  const parts: Buffer[] = []
  let bytes = 0
  for await (const part of request) {
    const chunk: Buffer = part
    bytes += chunk.length
    if (bytes > LONGEST_BODY_BYTES) return null
    parts.push(chunk)
  }
  return Buffer.concat(parts).toString('utf8')
}

const refusal = (status: number, body: string): Answer => ({
  status,
  headers: { 'content-type': 'text/plain' },
  body,
})

async function receive(desk: Desk, request: IncomingMessage): Promise<Answer | null> {
  const { method = 'GET', headers } = request
  // A page elsewhere in the same browser may not change the weather here.
  if (method !== 'GET' && headers['sec-fetch-site'] === 'cross-site') return refusal(403, 'Not from there')
  const body = await bodyOf(request)
  if (body === null) return refusal(413, 'Too long')
  return answerTo(desk, {
    method,
    url: new URL(request.url ?? '/', 'http://practice.invalid'),
    body,
    isJson: headers['content-type']?.startsWith('application/json') ?? false,
  })
}

function send(response: ServerResponse, { status, headers, body }: Answer): void {
  response.writeHead(status, {
    'cache-control': 'no-store',
    'x-content-type-options': 'nosniff',
    'content-length': Buffer.byteLength(body),
    ...headers,
  })
  response.end(body)
}

/** Starts the practice forecast in this process, on loopback; the caller stops it. */
export async function startForecast(wish: ForecastWish = {}): Promise<RunningForecast> {
  const book = openWeatherBook(wish.weatherFile ?? null)
  const desk: Desk = { book, now: () => new Date(Date.now() + (wish.clockOffsetMs ?? 0)) }
  let asked = 0
  const server = createServer((request, response) => {
    if (request.url?.startsWith('/v1/forecast')) asked += 1
    receive(desk, request).then(
      (answer) => {
        if (answer) send(response, answer)
      },
      (error: unknown) => {
        process.stderr.write(`${String(error)}\n`)
        request.socket.destroy()
      },
    )
  })
  await new Promise<void>((done, fail) => {
    server.once('error', fail)
    server.listen(wish.port ?? 0, HOST, done)
  })
  const { port } = server.address() as AddressInfo
  return {
    url: `http://${HOST}:${port}`,
    setWeather: ({ where = null, ...rule }) => void book.add({ where, ...rule }),
    clearWeather: book.clear,
    setMode: book.setMode,
    asked: () => asked,
    stop: () =>
      new Promise((done) => {
        server.close(() => done())
        server.closeAllConnections()
      }),
  }
}
