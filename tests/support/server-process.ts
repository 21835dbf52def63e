import { spawn } from 'node:child_process'
import { once } from 'node:events'

import { plainEnvironment } from '@/scripts/plain-environment.mjs'
import { tryPort } from '@/scripts/ports.mjs'

const UP_WITHIN_MS = 40_000
const STOP_WITHIN_MS = 12_000

export interface ServerProcess {
  origin: string
  port: number
  pid: number
  /** Every line it has written so far. */
  lines: () => string[]
  ended: Promise<{ code: number | null; signal: NodeJS.Signals | null }>
  /** As the kernel would: no goodbye. */
  kill: () => Promise<void>
  /** Asks it to end and waits; killed when it does not. */
  stop: () => Promise<{ code: number | null; signal: NodeJS.Signals | null }>
}

export interface ServerWish {
  /** What is undefined is left out of the environment. */
  environment: Record<string, string | undefined>
  /** The same port again after a restart; left out: a free one. */
  port?: number
  /** False: do not wait until it answers, because it may die at once. */
  awaited?: boolean
}

async function waitUntilAlive(origin: string, isDead: () => boolean): Promise<void> {
  const until = Date.now() + UP_WITHIN_MS
  while (Date.now() < until && !isDead()) {
    const answer = await fetch(`${origin}/healthz`).catch(() => null)
    if (answer?.ok) return
    await new Promise((done) => setTimeout(done, 50))
  }
  throw new Error('the server did not come up')
}

/** The product's own server program, as `npm start` runs it, under the settings given. */
export async function startServerProcess(wish: ServerWish): Promise<ServerProcess> {
  const port = wish.port ?? (await tryPort(0)) ?? 0
  const origin = `http://127.0.0.1:${port}`
  const env: NodeJS.ProcessEnv = {
    NODE_ENV: 'development',
    ...plainEnvironment(),
    ...wish.environment,
    PORT: String(port),
  }
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
    env,
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  let said = ''
  const hear = (part: Buffer) => (said += part.toString())
  child.stdout.on('data', hear)
  child.stderr.on('data', hear)
  let dead = false
  const ended = once(child, 'exit').then(([code, signal]) => {
    dead = true
    return { code: code as number | null, signal: signal as NodeJS.Signals | null }
  })
  // A run that is broken off leaves no server behind.
  const dropIt = () => child.kill('SIGKILL')
  process.once('exit', dropIt)
  void ended.then(() => process.off('exit', dropIt))
  const server: ServerProcess = {
    origin,
    port,
    pid: child.pid ?? 0,
    lines: () => said.split('\n').filter(Boolean),
    ended,
    kill: async () => {
      child.kill('SIGKILL')
      await ended
    },
    stop: async () => {
      child.kill('SIGTERM')
      const hard = setTimeout(() => child.kill('SIGKILL'), STOP_WITHIN_MS)
      const how = await ended
      clearTimeout(hard)
      return how
    },
  }
  if (wish.awaited === false) return server
  await waitUntilAlive(origin, () => dead).catch(async (error: Error) => {
    await server.kill()
    throw new Error(`${error.message}: ${said.slice(-2000)}`)
  })
  return server
}
