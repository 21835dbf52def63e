// A program of its own: answers like the forecast service, with invented weather that its page lets one set.
import { parseArgs } from 'node:util'

import { startForecast } from './start-fake'

/** `--clock-offset -5` as well as `--clock-offset=-5`: the parser takes a lone leading dash for a new option. */
const args = process.argv.slice(2).flatMap((one, at, all) => {
  const next = all[at + 1]
  if (one === '--clock-offset' && next !== undefined) return [`${one}=${next}`]
  return all[at - 1] === '--clock-offset' ? [] : [one]
})
const { values } = parseArgs({
  args,
  options: {
    port: { type: 'string', default: '8028' },
    'clock-offset': { type: 'string', default: '0' },
    weather: { type: 'string', default: '.data/weather.json' },
  },
})

function wholeNumber(name: 'clock-offset' | 'port'): number {
  const text = values[name]
  if (!/^-?\d+$/.test(text)) throw new Error(`--${name} wants a whole number, not "${text}"`)
  return Number(text)
}

const forecast = await startForecast({
  port: wholeNumber('port'),
  clockOffsetMs: wholeNumber('clock-offset'),
  weatherFile: values.weather,
})
process.stdout.write(`practice forecast on ${forecast.url} (kept in ${values.weather})\n`)

for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.once(signal, () => void forecast.stop().then(() => process.exit(0)))
}
