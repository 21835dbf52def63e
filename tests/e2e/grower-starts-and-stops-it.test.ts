import { execFile, spawn, type ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { mkdtemp, readFile, rm } from 'node:fs/promises'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { promisify } from 'node:util'

import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { commandOf } from '@/scripts/mariadb-leftover.mjs'
import { plainEnvironment } from '@/scripts/plain-environment.mjs'

const READY = /Tankward is ready: +(\S+)/
const run = promisify(execFile)

interface Started {
  child: ChildProcess
  said: () => string
  /** The address it printed; fails when it ended before. */
  ready: Promise<string>
}

function start(dataDir: string, ...options: string[]): Started {
  const child = spawn('node', ['scripts/start.mjs', '--data', dataDir, ...options], {
    env: { ...plainEnvironment(), NODE_ENV: 'development' },
  })
  let words = ''
  const ready = new Promise<string>((done, fail) => {
    child.stdout.on('data', (part: Buffer) => {
      words += part.toString()
      const address = READY.exec(words)?.[1]
      if (address) done(address)
    })
    child.once('exit', () => fail(new Error(words)))
  })
  return { child, said: () => words, ready }
}

async function ending({ child }: Started): Promise<number | null> {
  if (child.exitCode === null) await once(child, 'exit')
  return child.exitCode
}

/** Every running program that was started for that folder. */
async function programsOf(dataDir: string): Promise<string[]> {
  const { stdout } = await run('ps', ['-eo', 'args'])
  return stdout.split('\n').filter((line) => line.includes(dataDir))
}

describe('starting and stopping everything', () => {
  let dataDir: string
  let first: Started
  let origin: string

  beforeAll(async () => {
    dataDir = await mkdtemp(path.join(tmpdir(), 'tankward-start-'))
    first = start(dataDir, '--port', '0')
    origin = await first.ready
  }, 300_000)
  afterAll(async () => {
    first.child.kill()
    await ending(first)
    await rm(dataDir, { recursive: true, force: true })
  })

  it('serves the app, the mail page, the practice payments and the practice weather', async () => {
    const [mail, pay, weather] = [
      /Mail it has sent: +(\S+)/,
      /Practice payments: +(\S+)/,
      /Practice weather: +(\S+)/,
    ].map((line) => line.exec(first.said())?.[1])
    for (const address of [origin, `${origin}/readyz`, mail, pay, weather]) {
      expect((await fetch(String(address))).status, address).toBe(200)
    }
  })

  it('refuses a second start from the same folder, and says where the first one is', async () => {
    const second = start(dataDir, '--port', '0')
    await expect(second.ready).rejects.toThrow(
      `already runs from this folder (process ${first.child.pid}, ${origin})`,
    )
    expect(await ending(second)).toBe(1)
    expect((await fetch(`${origin}/healthz`)).status).toBe(200)
  })

  it('says in one sentence that the port is taken, and starts nothing', async () => {
    const taken = createServer().listen(0, '127.0.0.1')
    await once(taken, 'listening')
    const { port } = taken.address() as AddressInfo
    const elsewhere = await mkdtemp(path.join(tmpdir(), 'tankward-port-'))
    const second = start(elsewhere, '--port', String(port))
    await expect(second.ready).rejects.toThrow(
      `Port ${port} is in use by another program. Free it, or choose another: npm start -- --port ${port + 1}`,
    )
    expect(await ending(second)).toBe(1)
    expect(await programsOf(elsewhere)).toEqual([])
    taken.close()
    await rm(elsewhere, { recursive: true, force: true })
  })

  it('ends every program within ten seconds of SIGTERM', async () => {
    const note = JSON.parse(await readFile(path.join(dataDir, 'running.json'), 'utf8')) as {
      programs: { pid: number }[]
    }
    expect(note.programs).toHaveLength(4)
    const began = Date.now()
    first.child.kill('SIGTERM')
    expect(await ending(first)).toBe(0)
    expect(Date.now() - began).toBeLessThan(10_000)
    expect(await programsOf(dataDir)).toEqual([])
    expect(await Promise.all(note.programs.map(({ pid }) => commandOf(pid)))).toEqual(
      note.programs.map(() => null),
    )
  })
})
