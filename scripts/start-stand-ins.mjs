import path from 'node:path'

import { plainEnvironment } from './plain-environment.mjs'
import { waitUntilUp } from './wait-until-up.mjs'

const TSX = ['node', '--import', 'tsx']

/**
 * @typedef {object} StandIns
 * @property {string} dataDir
 * @property {string} origin of the product
 * @property {number} clockOffsetMs
 * @property {{ smtp: number, mail: number, pay: number, weather: number }} ports
 * @property {import('./secrets.mjs').Secrets} secrets
 */

/** Catches every mail of the product and shows it. @param {import('./crew.mjs').Crew} crew @param {StandIns} given */
export async function startMailCatcher(crew, { dataDir, ports }) {
  const url = `http://127.0.0.1:${ports.mail}`
  const member = crew.start({
    name: 'mail catcher',
    command: [
      ...[...TSX, 'server/mail/catcher/main.ts'],
      ...['--smtp-port', String(ports.smtp), '--page-port', String(ports.mail)],
      ...['--folder', path.join(dataDir, 'mail')],
    ],
    environment: plainEnvironment(),
  })
  await waitUntilUp(member, `${url}/healthz`)
  return { member, url }
}

/** The practice payment processor; it keeps its books on disk. @param {import('./crew.mjs').Crew} crew @param {StandIns} given */
export async function startPayments(crew, { dataDir, origin, clockOffsetMs, ports, secrets }) {
  const url = `http://127.0.0.1:${ports.pay}`
  const member = crew.start({
    name: 'practice payment processor',
    command: [
      ...[...TSX, 'payments/fake/main.ts', '--port', String(ports.pay)],
      ...['--books', path.join(dataDir, 'stripe'), '--platform-origin', origin],
      ...['--webhook-url', `${origin}/api/v1/stripe-events`, '--clock-offset', String(clockOffsetMs)],
    ],
    environment: { ...plainEnvironment(), PAYMENTS_FAKE_WEBHOOK_SECRET: secrets.stripeWebhook },
  })
  await waitUntilUp(member, url)
  return { member, url }
}

/** The practice forecast: invented weather, which its page lets one set. @param {import('./crew.mjs').Crew} crew @param {StandIns} given */
export async function startForecast(crew, { dataDir, clockOffsetMs, ports }) {
  const url = `http://127.0.0.1:${ports.weather}`
  const member = crew.start({
    name: 'practice forecast',
    command: [
      ...[...TSX, 'server/forecast/fake/main.ts', '--port', String(ports.weather)],
      ...['--clock-offset', String(clockOffsetMs), '--weather', path.join(dataDir, 'weather.json')],
    ],
    environment: plainEnvironment(),
  })
  await waitUntilUp(member, `${url}/healthz`)
  return { member, url }
}
