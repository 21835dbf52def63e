import { parseArgs } from 'node:util'

import { Fault } from './fault.mjs'

const DAY_MS = 86_400_000

/**
 * Whole days from today to that date, in milliseconds: domain time then runs that far ahead of real time.
 * @param {string} date such as 2027-01-15 @param {Date} today
 */
export function clockOffsetMs(date, today) {
  const at = /^\d{4}-\d{2}-\d{2}$/.test(date) ? new Date(`${date}T00:00:00Z`) : new Date(NaN)
  if (Number.isNaN(at.getTime()) || !at.toISOString().startsWith(date)) {
    throw new Fault(`--date wants a real day written like 2027-01-15, not "${date}".`)
  }
  return at.getTime() - Math.floor(today.getTime() / DAY_MS) * DAY_MS
}

/** @param {string} text */
function portOf(text) {
  const port = Number(text)
  if (!/^\d+$/.test(text) || port > 65_535) {
    throw new Fault(`The port has to be a number from 0 (any free one) to 65535, not "${text}".`)
  }
  return port
}

/** @param {string[]} args @param {Record<string, string | undefined>} environment */
export function readStartOptions(args, environment) {
  const options = /** @type {const} */ ({
    port: { type: 'string' },
    date: { type: 'string' },
    data: { type: 'string' },
    watch: { type: 'boolean' },
  })
  let values
  try {
    values = parseArgs({ args, options, strict: true }).values
  } catch (error) {
    const why = error instanceof Error ? error.message : String(error)
    throw new Fault(`${why}\nKnown: --port 8080, --date 2027-01-15, --data <folder>, --watch.`)
  }
  if (values.date && environment.NODE_ENV === 'production') {
    throw new Fault('--date is for local work only: in production the clock is the real one.')
  }
  return {
    port: portOf(values.port ?? environment.PORT ?? '8080'),
    clockOffsetMs: values.date ? clockOffsetMs(values.date, new Date()) : 0,
    dataDir: values.data ?? null,
    watch: values.watch === true,
  }
}
