import { mkdir } from 'node:fs/promises'

import { forgetDemo, seedWasCut } from './demo-ground.mjs'
import { Fault } from './fault.mjs'
import { rememberedPorts, tryPort } from './ports.mjs'
import { takeOver, writeNote } from './run-note.mjs'
import { readSecrets } from './secrets.mjs'
import { seedOnce } from './seed-once.mjs'
import { namedIn, serverEnvironment } from './server-environment.mjs'
import { startDatabase } from './start-database.mjs'
import { startForecast, startMailCatcher, startPayments } from './start-stand-ins.mjs'
import { step } from './tell.mjs'

// Beside the server's own 8080; tried at the first start of a data folder.
const FIRST_PORTS = { smtp: 8025, mail: 8026, pay: 8027, weather: 8028 }
const ANY_PORTS = { smtp: 0, mail: 0, pay: 0, weather: 0 }

/** @param {number} wanted */
async function portFor(wanted) {
  const port = await tryPort(wanted)
  if (port !== null) return port
  throw new Fault(
    `Port ${wanted} is in use by another program. Free it, or choose another: npm start -- --port ${wanted + 1}`,
  )
}

/**
 * Makes the data folder ours, and finds the server's port free. Nothing may be written there before.
 * @param {string} dataDir @param {number} wantedPort
 */
export async function claimGround(dataDir, wantedPort) {
  await mkdir(dataDir, { recursive: true })
  await takeOver(dataDir)
  const port = await portFor(wantedPort)
  const origin = `http://127.0.0.1:${port}`
  await writeNote(dataDir, { origin, pids: [] })
  return { port, origin }
}

/**
 * Everything the server stands on: database with its first rows, mail, payments, forecast, settings.
 * @param {import('./crew.mjs').Crew} crew
 * @param {Omit<import('./start-product.mjs').ProductOptions, 'onDeath'> & { origin: string, startOver?: boolean }} options
 */
export async function layGround(crew, options) {
  const { dataDir, port, origin, clockOffsetMs, durable, environment } = options
  const named = namedIn(environment)
  const startOver = options.startOver === true || (!named.database && (await seedWasCut(dataDir)))
  if (startOver) await forgetDemo(dataDir)
  const secrets = await readSecrets(dataDir)
  const ports = await rememberedPorts(dataDir, durable ? FIRST_PORTS : ANY_PORTS)
  const given = { dataDir, origin, clockOffsetMs, ports, secrets }
  const [database, mail, payments, forecast] = await Promise.all([
    named.database ? null : step('Database', () => startDatabase(crew, { dataDir, durable, startOver })),
    named.mail ? null : startMailCatcher(crew, given),
    named.payments ? null : startPayments(crew, given),
    named.forecast ? null : startForecast(crew, given),
  ])
  const databaseUrl = environment.DATABASE_URL ?? database?.url ?? ''
  const settings = serverEnvironment({ ...given, port, databaseUrl }, environment)
  if (database) await seedOnce(crew, { dataDir, ownerUrl: database.ownerUrl, settings })
  return { database, mail, payments, forecast, settings }
}
