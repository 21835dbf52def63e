import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdir, mkdtemp, readFile, rm, writeFile } from 'node:fs/promises'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'

import mysql, { type RowDataPacket } from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { startMariadb, type Mariadb } from '@/scripts/mariadb.mjs'
import { explain, MariadbFault } from '@/scripts/mariadb-fault.mjs'

const settings = { durable: false, bufferPoolMb: 32, databases: ['tankward_pond'] }

async function ask(url: string, sql: string): Promise<RowDataPacket[]> {
  const line = await mysql.createConnection({ uri: url })
  try {
    const [rows] = await line.query<RowDataPacket[]>(sql)
    return rows
  } finally {
    await line.end()
  }
}

describe('starting the database', () => {
  let dir: string
  const running: Mariadb[] = []

  async function start(more: { durable?: boolean; port?: number } = {}): Promise<Mariadb> {
    const server = await startMariadb({ dir, ...settings, ...more })
    running.push(server)
    return server
  }

  beforeAll(async () => {
    dir = await mkdtemp(path.join(tmpdir(), 'pond-'))
  })
  afterAll(async () => {
    await running[running.length - 1]?.stop()
    await rm(dir, { recursive: true, force: true })
  })

  it('keeps what was stored over a stop and a start, and the app may not shape tables', async () => {
    const first = await start()
    await ask(first.url('tankward_pond', 'owner'), 'CREATE TABLE fish (n INT PRIMARY KEY)')
    await ask(first.url('tankward_pond'), 'INSERT INTO fish VALUES (20)')
    await expect(ask(first.url('tankward_pond'), 'DROP TABLE fish')).rejects.toThrow(/denied/)
    await expect(ask(first.url('mysql'), 'SELECT 1')).rejects.toThrow(/denied/)
    await first.stop()
    const second = await start({ durable: true })
    const settled =
      'SELECT n, @@innodb_flush_log_at_trx_commit AS flush, @@innodb_doublewrite AS twice FROM fish'
    expect(await ask(second.url('tankward_pond'), settled)).toEqual([{ n: 20, flush: 1, twice: 1 }])
    expect(
      await ask(
        second.url('tankward_pond'),
        'SELECT @@innodb_snapshot_isolation AS snap, @@time_zone AS zone',
      ),
    ).toEqual([{ snap: 1, zone: '+00:00' }])
    await second.stop()
  })

  it('ends a server whose starter was killed, and goes on with its data', async () => {
    const script = `import { startMariadb } from ${JSON.stringify(path.resolve('scripts/mariadb.mjs'))}
      await startMariadb(${JSON.stringify({ dir, ...settings })})
      console.log('ready')
      setInterval(() => {}, 1000)`
    const starter = spawn(process.execPath, ['--input-type=module', '-e', script])
    await once(starter.stdout, 'data')
    await expect(start()).rejects.toThrow(/in use by process \d+, which is still running/)
    starter.kill('SIGKILL')
    await once(starter, 'exit')
    const server = await start()
    expect(await ask(server.url('tankward_pond'), 'SELECT n FROM fish')).toEqual([{ n: 20 }])
    await server.stop()
  })

  it('says so when the port is taken', async () => {
    const other = createServer()
    other.listen(0, '127.0.0.1')
    await once(other, 'listening')
    const taken = other.address()
    const port = taken && typeof taken === 'object' ? taken.port : 0
    await expect(start({ port })).rejects.toThrow(`Port ${port} on 127.0.0.1 is taken`)
    other.close()
  })

  it('says so when the folder is no database', async () => {
    const strange = await mkdtemp(path.join(tmpdir(), 'pond-'))
    await mkdir(path.join(strange, 'data'))
    await writeFile(path.join(strange, 'data', 'notes.txt'), 'feed at nine')
    await expect(startMariadb({ dir: strange, ...settings })).rejects.toThrow(
      /not a complete database folder/,
    )
    expect(await readFile(path.join(strange, 'data', 'notes.txt'), 'utf8')).toBe('feed at nine')
    await rm(strange, { recursive: true })
  })

  it('says so when the stored pages are damaged', async () => {
    const copy = path.join(dir, 'data', 'ibdata1')
    const sound = await readFile(copy)
    await writeFile(copy, Buffer.alloc(sound.length, 7))
    const fault = await start().catch((error: unknown) => error)
    await writeFile(copy, sound)
    expect(fault).toBeInstanceOf(MariadbFault)
    expect(String(fault)).toMatch(/is damaged or comes from another MariaDB version/)
  })

  it('knows a full disk and a folder without rights from the words of the server', () => {
    expect(explain('InnoDB: Error number 28 means "No space left on device"', '/pond')).toMatch(
      /disk .* is full/,
    )
    expect(explain('mariadbd: Can\'t create file (Errcode: 13 "Permission denied")', '/pond')).toMatch(
      /may not be written/,
    )
    expect(explain('all is well', '/pond')).toBeNull()
  })
})
