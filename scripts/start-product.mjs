import path from 'node:path'

import { exportWeb } from './export-web.mjs'
import { claimGround, layGround } from './lay-ground.mjs'
import { lastWords } from './last-words.mjs'
import { writeNote } from './run-note.mjs'
import { step } from './tell.mjs'
import { deathOf, waitUntilUp } from './wait-until-up.mjs'

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
 * @property {string | null} weatherOrigin
 * @property {string} databaseUrl as the app signs in
 * @property {() => Promise<void>} restartServer
 */

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
  const { port, origin } = await claimGround(dataDir, options.port)
  const [{ database, mail, payments, forecast, settings }] = await Promise.all([
    layGround(crew, { ...options, dataDir, port, origin }),
    step('Web app', () => exportWeb(crew)),
  ])
  const beside = [mail, payments, forecast].flatMap((one) => (one ? [one.member] : []))
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
    watchDatabase(database, async () => {
      const words = await lastWords(path.join(dataDir, 'mariadb', 'error.log'))
      if (!crew.isLeaving()) options.onDeath('database', deathOf('database', words))
    })
  }
  let server = await step('Server', startServer)
  return {
    origin,
    mailOrigin: mail?.url ?? null,
    payOrigin: payments?.url ?? null,
    weatherOrigin: forecast?.url ?? null,
    databaseUrl: settings.DATABASE_URL ?? '',
    restartServer: async () => {
      dismissed.add(server)
      await server.stop()
      server = await startServer()
    },
  }
}
