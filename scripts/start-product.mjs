import { mkdir } from 'node:fs/promises'
import path from 'node:path'

import { exportWeb } from './export-web.mjs'
import { Fault } from './fault.mjs'
import { rememberedPorts, tryPort } from './ports.mjs'
import { takeOver, writeNote } from './run-note.mjs'
import { readSecrets } from './secrets.mjs'
import { seedOnce } from './seed-once.mjs'
import { namedIn, serverEnvironment } from './server-environment.mjs'
import { startDatabase } from './start-database.mjs'
import { startMailCatcher, startPayments } from './start-stand-ins.mjs'
import { step } from './tell.mjs'
import { deathOf, waitUntilUp } from './wait-until-up.mjs'

// Beside the server's own 8080; tried at the first start of a data folder.
const FIRST_PORTS = { smtp: 8025, mail: 8026, pay: 8027 }

/**
 * @typedef {object} ProductOptions
 * @property {string} dataDir
 * @property {number} port 0: any free one
 * @property {number} clockOffsetMs
 * @property {boolean} durable false only for throw-away data
 * @property {Record<string, string | undefined>} environment names in it win over what we make up
 * @property {(name: string, fault: Error) => void} onDeath a program stopped by itself
 *
 * @typedef {object} Product
 * @property {string} origin
 * @property {string | null} mailOrigin null when the environment names a real mail server
 * @property {string | null} payOrigin
 * @property {string} databaseUrl as the app signs in
 * @property {() => Promise<void>} restartServer
 */

/** @param {number} wanted */
async function portFor(wanted) {
  const port = await tryPort(wanted)
  if (port !== null) return port
  throw new Fault(
    `Port ${wanted} is in use by another program. Free it, or choose another: npm start -- --port ${wanted + 1}`,
  )
}

/**
 * Everything the server stands on.
 * @param {import('./crew.mjs').Crew} crew @param {ProductOptions & { origin: string }} options
 */
async function layGround(crew, { dataDir, port, origin, clockOffsetMs, durable, environment }) {
  const secrets = await readSecrets(dataDir)
  const ports = await rememberedPorts(dataDir, FIRST_PORTS)
  const named = namedIn(environment)
  const given = { dataDir, origin, clockOffsetMs, ports, secrets }
  const [database, mail, payments] = await Promise.all([
    named.database ? null : step('Database', () => startDatabase(crew, { dataDir, durable })),
    named.mail ? null : startMailCatcher(crew, given),
    named.payments ? null : startPayments(crew, given),
  ])
  const databaseUrl = environment.DATABASE_URL ?? database?.url ?? ''
  const settings = serverEnvironment({ ...given, port, databaseUrl }, environment)
  if (database) await seedOnce(crew, { database, dataDir, settings })
  return { database, mail, payments, settings }
}

/** @param {{ pid: number }} database @param {() => void} gone */
function watchDatabase(database, gone) {
  const look = setInterval(() => {
    try {
      process.kill(database.pid, 0)
    } catch {
      clearInterval(look)
      gone()
    }
  }, 1_000)
  look.unref()
}

/**
 * Starts everything the product needs, the server last. The caller stops it through the crew.
 * @param {import('./crew.mjs').Crew} crew @param {ProductOptions} options
 * @returns {Promise<Product>}
 */
export async function startProduct(crew, options) {
  const dataDir = path.resolve(options.dataDir)
  await mkdir(dataDir, { recursive: true })
  await takeOver(dataDir)
  const port = await portFor(options.port)
  const origin = `http://127.0.0.1:${port}`
  await writeNote(dataDir, { origin, pids: [] })
  const [{ database, mail, payments, settings }] = await Promise.all([
    layGround(crew, { ...options, dataDir, port, origin }),
    step('Web app', () => exportWeb(crew)),
  ])
  const beside = [mail, payments].flatMap((one) => (one ? [one.member] : []))
  /** @type {Set<import('./crew.mjs').Member>} */
  const dismissed = new Set()

  /** @param {import('./crew.mjs').Member} member */
  const watch = async (member) => {
    await member.ended
    if (!crew.isLeaving() && !dismissed.has(member)) {
      options.onDeath(member.name, deathOf(member.name, await member.lastWords()))
    }
  }
  const startServer = async () => {
    const command = ['node', '--import', 'tsx', 'server/main.ts']
    const server = crew.start({ name: 'server', command, environment: settings, graceMs: 6_000 })
    await waitUntilUp(server, `${origin}/healthz`)
    void watch(server)
    const pids = [...beside, server].flatMap(({ pid }) => (pid ? [pid] : []))
    await writeNote(dataDir, { origin, pids })
    return server
  }
  for (const member of beside) void watch(member)
  if (database) {
    const fault = new Fault(
      `The database stopped by itself. Its last words are in ${dataDir}/mariadb/error.log.`,
    )
    watchDatabase(database, () => !crew.isLeaving() && options.onDeath('database', fault))
  }
  let server = await step('Server', startServer)
  return {
    origin,
    mailOrigin: mail?.url ?? null,
    payOrigin: payments?.url ?? null,
    databaseUrl: settings.DATABASE_URL ?? '',
    restartServer: async () => {
      dismissed.add(server)
      await server.stop()
      server = await startServer()
    },
  }
}
