// The thread beside the server in which the service's client runs. Plain JavaScript: a thread starts without tsx.
import { parentPort } from 'node:worker_threads'

import { fetchWeatherApi } from 'openmeteo'

// The client counts tries, not repeats: two tries are one repeat.
const TRIES = 2
const FIRST_GAP_S = 0.2
const LONGEST_GAP_S = 0.5

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
  if (!first) return { zone: '', offsetS: 0, daily: null, hourly: null }
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
