// The thread beside the server in which the service's client runs. Plain JavaScript: a thread starts without tsx.
import { Buffer } from 'node:buffer'
import { parentPort } from 'node:worker_threads'

import { fetchWeatherApi } from 'openmeteo'

// The client counts tries, not repeats: two tries are one repeat.
const TRIES = 2
const FIRST_GAP_S = 0.2
const LONGEST_GAP_S = 0.5
/** Ten days for one place are some 1.5 kB. */
const LONGEST_BODY_BYTES = 262_144
const LENGTH_BYTES = 4
/** What the client itself makes an error of. */
const KNOWN_ERRORS = [400, 429, 500, 502, 504]

/** @param {Response} response */
async function bytesOf(response) {
  const parts = []
  let count = 0
  for await (const part of /** @type {AsyncIterable<Uint8Array>} */ (response.body ?? [])) {
    count += part.length
    if (count > LONGEST_BODY_BYTES) throw new Error('the reply is longer than any forecast')
    parts.push(part)
  }
  return Buffer.concat(parts)
}

/** True when the messages, each with its length in front, lie end to end and fill the body. @param {Buffer} body */
function isFramed(body) {
  let at = 0
  while (at + LENGTH_BYTES <= body.length) {
    const length = body.readInt32LE(at)
    if (length < 2 * LENGTH_BYTES) return false
    at += LENGTH_BYTES + length
  }
  return at > 0 && at === body.length
}

const plainFetch = globalThis.fetch

// The client reads whatever comes as lengths and offsets: a page with status 503 too, and a negative length keeps it
// turning until the memory is full. It offers no place for a check but `fetch`, and this thread's is its alone.
globalThis.fetch = async (address, options) => {
  const response = await plainFetch(address, options)
  const { status, statusText } = response
  if (status !== 200 && !KNOWN_ERRORS.includes(status)) throw new Error(`status ${status}`)
  const body = await bytesOf(response)
  if (status === 200 && !isFramed(body)) throw new Error('the reply is no forecast')
  return new Response(body, { status, statusText })
}

/** @param {import('@openmeteo/sdk/variables-with-time').VariablesWithTime | null} block */
function blockOf(block) {
  if (!block) return null
  const lists = []
  for (let at = 0; at < block.variablesLength() && at < 8; at += 1) {
    lists.push([...(block.variables(at)?.valuesArray() ?? [])])
  }
  return { fromS: Number(block.time()), untilS: Number(block.timeEnd()), stepS: block.interval(), lists }
}

/** @param {import('./ask-service').ServiceAsk} ask @returns {Promise<import('./ask-service').ServiceReply>} */
async function answer({ address, params, withinMs }) {
  const options = { signal: AbortSignal.timeout(withinMs), redirect: /** @type {const} */ ('error') }
  const [first] = await fetchWeatherApi(address, params, TRIES, FIRST_GAP_S, LONGEST_GAP_S, options)
  if (!first) throw new Error('the reply names no place')
  return {
    zone: first.timezone() ?? '',
    offsetS: first.utcOffsetSeconds(),
    daily: blockOf(first.daily()),
    hourly: blockOf(first.hourly()),
  }
}

parentPort?.on('message', ({ id, ask }) => {
  answer(ask).then(
    (reply) => parentPort?.postMessage({ id, reply }),
    (error) => parentPort?.postMessage({ id, failure: String(error?.message ?? error).slice(0, 200) }),
  )
})
