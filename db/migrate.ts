import { existsSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

import { drizzle } from 'drizzle-orm/mysql2'
import { migrate } from 'drizzle-orm/mysql2/migrator'
import mysql from 'mysql2/promise'

const FOLDER = path.join(path.dirname(fileURLToPath(import.meta.url)), 'migrations')

/** Brings the database up to date. Needs the owner's address: the app's user may not shape tables. */
export async function migrateDatabase(ownerUrl: string, folder = FOLDER): Promise<void> {
  if (!existsSync(path.join(folder, 'meta', '_journal.json'))) return
  const connection = await mysql.createConnection({ uri: ownerUrl, timezone: 'Z' })
  try {
    await migrate(drizzle(connection), { migrationsFolder: folder })
  } finally {
    await connection.end()
  }
}
