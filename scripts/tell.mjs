import { stdout } from 'node:process'

const QUIET_FOR_MS = 2_000
const HEARTBEAT_MS = 10_000

/** @param {string} line */
export const tell = (line) => void stdout.write(`${line}\n`)

/** @param {number} sinceMs */
export const secondsSince = (sinceMs) => ((performance.now() - sinceMs) / 1_000).toFixed(1)

/**
 * Does the work and says how long it took; while it lasts, a line every ten seconds shows that it is alive.
 * @template T
 * @param {string} what such as "Installing packages"
 * @param {() => Promise<T>} work
 * @param {() => Promise<string>} [latest] how far the work is
 * @returns {Promise<T>}
 */
export async function step(what, work, latest = async () => '') {
  const began = performance.now()
  let isOver = false
  const first = setTimeout(() => tell(`${what} …`), QUIET_FOR_MS)
  const beat = setInterval(async () => {
    const words = await latest()
    if (isOver) return
    tell(`${what} … ${secondsSince(began)} s${words ? ` (${words})` : ''}`)
  }, HEARTBEAT_MS)
  try {
    const made = await work()
    tell(`${what}: ${secondsSince(began)} s`)
    return made
  } finally {
    isOver = true
    clearTimeout(first)
    clearInterval(beat)
  }
}
