import { readFile, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import mysql from 'mysql2/promise'

import { hashFiles } from './hash-files.mjs'
import { startMariadb } from './mariadb.mjs'
import { narrowRights } from './narrow-rights.mjs'
import { plainEnvironment } from './plain-environment.mjs'
import { ROOT } from './project-root.mjs'

export const DATABASE = 'tankward'

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
 * Our own MariaDB under `<dataDir>/mariadb`, migrated; `startOver`: emptied first.
 * @param {import('./crew.mjs').Crew} crew
 * @param {{ dataDir: string, durable: boolean, startOver?: boolean }} options
 */
export async function startDatabase(crew, { dataDir, durable, startOver = false }) {
  const dir = path.join(dataDir, 'mariadb')
  const migrated = path.join(dir, 'migrated')
  const server = await crew.adopt(
    startMariadb({ dir, durable, bufferPoolMb: durable ? 256 : 128, databases: [DATABASE] }),
  )
  if (startOver) {
    await rm(migrated, { force: true })
    await emptyDatabase(server)
  }
  await migrate(crew, server.url(DATABASE, 'owner'), migrated)
  await narrowRights(server, DATABASE)
  return { pid: server.pid, url: server.url(DATABASE), ownerUrl: server.url(DATABASE, 'owner') }
}
