import { explainFailure } from './explain-failure.mjs'
import { Fault } from './fault.mjs'

const LONGEST_MS = 60_000
const EVERY_MS = 50

/** @param {string} name @param {string} words */
export const deathOf = (name, words) => {
  const known = explainFailure(words)
  return new Fault(`${known ? `${known}\n` : ''}The ${name} stopped by itself. Its last words:\n${words}`)
}

/**
 * Waits until the program answers over HTTP; its death ends the wait with its last words.
 * @param {import('./crew.mjs').Member} member @param {string} url
 */
export async function waitUntilUp(member, url) {
  let dead = false
  void member.ended.then(() => (dead = true))
  const until = performance.now() + LONGEST_MS
  while (performance.now() < until) {
    if (dead) throw deathOf(member.name, await member.lastWords())
    const answer = await fetch(url, { signal: AbortSignal.timeout(2_000) }).catch(() => null)
    await answer?.body?.cancel()
    if (answer && answer.status < 500) return
    await new Promise((done) => setTimeout(done, EVERY_MS))
  }
  throw new Fault(
    `The ${member.name} did not answer within ${LONGEST_MS / 1_000} s. Its last words:\n${await member.lastWords()}`,
  )
}
