import { randomBytes } from 'node:crypto'

import mysql, { type RowDataPacket } from 'mysql2/promise'
import { inject } from 'vitest'

import { TEST_PREFIX } from '@/tests/support/database-server'

export interface TestDatabase {
  name: string
  /** As the product signs in: rows only. */
  url: string
  /** For tests that shape tables of their own. */
  ownerUrl: string
  drop: () => Promise<void>
}

function withDatabase(address: string, name: string): string {
  const url = new URL(address)
  url.pathname = `/${name}`
  return url.toString()
}

/** Copies tables with keys, checks, foreign keys and rows: CREATE TABLE … LIKE would leave the foreign keys out. */
async function copyTables(owner: mysql.Connection, template: string): Promise<void> {
  const [tables] = await owner.query<RowDataPacket[]>(
    `SELECT table_name AS name FROM information_schema.tables
     WHERE table_schema = ? AND table_type = 'BASE TABLE'`,
    [template],
  )
  await owner.query('SET SESSION foreign_key_checks = 0')
  for (const { name } of tables as { name: string }[]) {
    const [shown] = await owner.query<RowDataPacket[]>(`SHOW CREATE TABLE \`${template}\`.\`${name}\``)
    await owner.query(String(shown[0]?.['Create Table']))
    const [some] = await owner.query<RowDataPacket[]>(`SELECT 1 FROM \`${template}\`.\`${name}\` LIMIT 1`)
    if (some.length) await owner.query(`INSERT INTO \`${name}\` SELECT * FROM \`${template}\`.\`${name}\``)
  }
}

/** A migrated database of its own for one test file. `label` is lower case words with underscores. */
export async function freshDatabase(label: string): Promise<TestDatabase> {
  const { templateUrl, appUrl } = inject('testServer')
  const name = `${TEST_PREFIX}${label.slice(0, 24)}_${randomBytes(4).toString('hex')}`
  const template = new URL(templateUrl).pathname.slice(1)
  const owner = await mysql.createConnection({ uri: templateUrl })
  try {
    await owner.query(`CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`)
    await owner.query(`USE \`${name}\``)
    await copyTables(owner, template)
  } finally {
    await owner.end()
  }
  const ownerUrl = withDatabase(templateUrl, name)
  return {
    name,
    url: withDatabase(appUrl, name),
    ownerUrl,
    drop: async () => {
      const line = await mysql.createConnection({ uri: ownerUrl })
      await line.query(`DROP DATABASE \`${name}\``)
      await line.end()
    },
  }
}
