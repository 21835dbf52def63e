import mysql, { type RowDataPacket } from 'mysql2/promise'
import { afterAll, describe, expect, inject, it } from 'vitest'

import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

describe('a database of its own for each test file', () => {
  const made: TestDatabase[] = []
  afterAll(() => Promise.all(made.map((one) => one.drop())))

  async function tablesOf(url: string): Promise<string[]> {
    const line = await mysql.createConnection({ uri: url })
    const [rows] = await line.query<RowDataPacket[]>(
      'SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() ORDER BY 1',
    )
    await line.end()
    return rows.map((row) => String(row.name))
  }

  it('has every table of the migrated one', async () => {
    const fresh = await freshDatabase('copy')
    made.push(fresh)
    expect(await tablesOf(fresh.url)).toEqual(await tablesOf(inject('testServer').templateUrl))
  })

  it('lets the product change rows but not tables', async () => {
    const fresh = await freshDatabase('rights')
    made.push(fresh)
    const owner = await mysql.createConnection({ uri: fresh.ownerUrl })
    await owner.query('CREATE TABLE pond (fish INT PRIMARY KEY)')
    await owner.end()
    const app = await mysql.createConnection({ uri: fresh.url })
    await app.query('INSERT INTO pond VALUES (20)')
    await expect(app.query('DROP TABLE pond')).rejects.toThrow(/denied/)
    await expect(app.query('SELECT * FROM mysql.global_priv')).rejects.toThrow(/denied/)
    await app.end()
  })
})
