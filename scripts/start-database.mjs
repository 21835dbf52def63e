import { access, readFile, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import mysql from 'mysql2/promise'

import { hashFiles } from './hash-files.mjs'
import { startMariadb } from './mariadb.mjs'
import { narrowRights } from './narrow-rights.mjs'
import { plainEnvironment } from './plain-environment.mjs'
import { ROOT } from './project-root.mjs'

export const DATABASE = 'tankward'

/** @param {string} file */
const exists = (file) =>
  access(file).then(
    () => true,
    () => false,
  )

/** @param {import('./mariadb.mjs').Mariadb} server */
async function emptyDatabase(server) {
  const owner = await mysql.createConnection({ uri: server.url(DATABASE, 'owner') })
  await owner.query(`DROP DATABASE \`${DATABASE}\``)
  await owner.query(`CREATE DATABASE \`${DATABASE}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`)
  await owner.end()
}

/** @param {import('./crew.mjs').Crew} crew @param {string} ownerUrl @param {string} stamp */
async function migrate(crew, ownerUrl, stamp) {
  const hash = await hashFiles(ROOT, ['db/migrations', 'db/migrate.ts'], () => true)
  if ((await readFile(stamp, 'utf8').catch(() => null)) === hash) return
  await crew.run({
    name: 'migrations',
    command: ['node', 'scripts/migrate-database.mjs'],
    environment: { ...plainEnvironment(), DATABASE_OWNER_URL: ownerUrl },
  })
  await writeFile(stamp, hash)
}

/**
 * Our own MariaDB under `<dataDir>/mariadb`, migrated. A seed that was cut short is begun again from nothing.
 * @param {import('./crew.mjs').Crew} crew
 * @param {{ dataDir: string, durable: boolean, startOver?: boolean }} options
 */
export async function startDatabase(crew, { dataDir, durable, startOver = false }) {
  const dir = path.join(dataDir, 'mariadb')
  const begun = path.join(dir, 'seed-begun')
  const done = path.join(dir, 'seed-done')
  const migrated = path.join(dir, 'migrated')
  const server = await crew.adopt(
    startMariadb({ dir, durable, bufferPoolMb: durable ? 256 : 128, databases: [DATABASE] }),
  )
  if (startOver || ((await exists(begun)) && !(await exists(done)))) {
    await emptyDatabase(server)
    await Promise.all([begun, done, migrated].map((mark) => rm(mark, { force: true })))
  }
  await migrate(crew, server.url(DATABASE, 'owner'), migrated)
  await narrowRights(server, DATABASE)
  return {
    pid: server.pid,
    url: server.url(DATABASE),
    ownerUrl: server.url(DATABASE, 'owner'),
    isSeeded: () => exists(done),
    /** @param {() => Promise<void>} seed */
    seedOnce: async (seed) => {
      await writeFile(begun, '')
      await seed()
      await writeFile(done, '')
    },
  }
}
