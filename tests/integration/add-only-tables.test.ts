import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'

import mysql from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { makeCrew, type Crew } from '@/scripts/crew.mjs'
import { startDatabase } from '@/scripts/start-database.mjs'

describe('the database as the start command hands it to the product', () => {
  let dataDir: string
  let crew: Crew
  let product: mysql.Connection

  beforeAll(async () => {
    dataDir = await mkdtemp(path.join(tmpdir(), 'tankward-rights-'))
    crew = makeCrew(path.join(dataDir, 'logs'))
    const { url } = await startDatabase(crew, { dataDir, durable: false })
    product = await mysql.createConnection({ uri: url })
  })
  afterAll(async () => {
    await product.end()
    await crew.stopAll()
    await rm(dataDir, { recursive: true, force: true })
  })

  it.each(['ledger_group', 'ledger_entry', 'audit_log'])(
    'lets rows of %s be added and read only',
    async (table) => {
      await expect(product.query(`SELECT COUNT(*) FROM ${table}`)).resolves.toBeDefined()
      // Without columns the row is refused for its values, not for want of the right to add one.
      await expect(product.query(`INSERT INTO ${table} () VALUES ()`)).rejects.not.toThrow(/denied/)
      await expect(product.query(`UPDATE ${table} SET id = id`)).rejects.toThrow(/denied/)
      await expect(product.query(`DELETE FROM ${table}`)).rejects.toThrow(/denied/)
      await expect(product.query(`TRUNCATE TABLE ${table}`)).rejects.toThrow(/denied/)
    },
  )

  it.each(['rating', 'survival'])('lets no row of %s be removed', async (table) => {
    await expect(product.query(`SELECT COUNT(*) FROM ${table}`)).resolves.toBeDefined()
    await expect(product.query(`UPDATE ${table} SET order_id = order_id`)).resolves.toBeDefined()
    await expect(product.query(`DELETE FROM ${table}`)).rejects.toThrow(/denied/)
  })

  it('lets rows of every other table be changed', async () => {
    await expect(product.query('UPDATE outbox SET seq = seq')).resolves.toBeDefined()
    await expect(product.query('DELETE FROM outbox')).resolves.toBeDefined()
  })

  it('lets nobody who runs the product shape tables or forge the list of migrations', async () => {
    await expect(product.query('ALTER TABLE outbox ADD COLUMN x INT')).rejects.toThrow(/denied/)
    await expect(product.query('SELECT COUNT(*) FROM __drizzle_migrations')).resolves.toBeDefined()
    await expect(product.query('DELETE FROM __drizzle_migrations')).rejects.toThrow(/denied/)
  })
})
