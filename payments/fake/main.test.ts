import { spawn, type ChildProcess } from 'node:child_process'
import { appendFileSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import Stripe from 'stripe'
import { afterEach, describe, expect, it } from 'vitest'
import { startWebhookCatcher } from './webhook-catcher-for-tests'

const running: ChildProcess[] = []
const folder = mkdtempSync(join(tmpdir(), 'payments-fake-'))
afterEach(() => {
  for (const child of running.splice(0)) child.kill('SIGKILL')
  rmSync(folder, { recursive: true, force: true })
})

interface Started {
  child: ChildProcess
  port: number
}

async function start(more: string[] = []): Promise<Started> {
  const args = [
    '--import',
    'tsx',
    'payments/fake/main.ts',
    '--books',
    folder,
    '--webhook-first-gap-ms',
    '50',
    ...more,
  ]
  const child = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'inherit'] })
  running.push(child)
  const line = await new Promise<string>((resolve) =>
    child.stdout?.once('data', (text) => resolve(String(text))),
  )
  const port = /listening on http:\/\/127\.0\.0\.1:(\d+)/.exec(line)?.[1]
  if (!port) throw new Error(`not a listening line: ${line}`)
  return { child, port: Number(port) }
}

function exitOf(child: ChildProcess): Promise<number | null> {
  return new Promise((resolve) => child.once('exit', (code) => resolve(code)))
}

function sdk(port: number): Stripe {
  return new Stripe('sk_test_x', {
    host: '127.0.0.1',
    port,
    protocol: 'http',
    maxNetworkRetries: 0,
    telemetry: false,
  })
}

const params = {
  amount: 1335,
  currency: 'usd',
  payment_method: 'pm_card_visa',
  confirm: true,
  capture_method: 'manual',
} as const

// Each start loads the program anew, a second or two.
describe('the practice processor as a program of its own', { timeout: 60_000 }, () => {
  it('killed between requests keeps ids, money and idempotent answers, and resends what was not acknowledged', async () => {
    const catcher = await startWebhookCatcher()
    catcher.answerWith(500)
    const first = await start(['--webhook-url', catcher.url, '--webhook-secret', 'whsec_test'])
    const held = await sdk(first.port).paymentIntents.create(params, { idempotencyKey: 'held' })
    await catcher.until((caught) => caught.length >= 1)
    const dead = exitOf(first.child)
    first.child.kill('SIGKILL')
    await dead
    // What a kill in the middle of a write leaves behind.
    appendFileSync(join(folder, 'journal.jsonl'), '{"line":99,"changes":[{"table":"pay')
    catcher.answerWith(200)
    const before = catcher.caught.length

    const second = await start(['--webhook-url', catcher.url, '--webhook-secret', 'whsec_test'])
    const stripe = sdk(second.port)
    const again = await stripe.paymentIntents.create(params, { idempotencyKey: 'held' })
    expect(again).toEqual(held)
    expect((await stripe.paymentIntents.list()).data.map((one) => one.id)).toEqual([held.id])
    await catcher.until((caught) => caught.length > before)
    expect(catcher.caught.at(-1)?.id).toBe(catcher.first().id)

    const captured = await stripe.paymentIntents.capture(held.id)
    const killedAgain = exitOf(second.child)
    second.child.kill('SIGKILL')
    await killedAgain
    const third = await start()
    expect((await sdk(third.port).paymentIntents.retrieve(held.id)).status).toBe(captured.status)
    await catcher.stop()
  })

  it('killed in the middle of the work answers every repeated request with what it did before', async () => {
    const keys = Array.from({ length: 40 }, (_, index) => `hold:${index}`)
    const known = new Map<string, string>()
    const changed: string[] = []
    const note = (key: string, id: string) => {
      if ((known.get(key) ?? id) !== id) changed.push(key)
      known.set(key, id)
    }
    for (const killAfterAnswers of [3, 15]) {
      const { child, port } = await start()
      const dead = exitOf(child)
      const stripe = sdk(port)
      let answers = 0
      const asked = keys.map(async (key) => {
        const { id } = await stripe.paymentIntents.create(params, { idempotencyKey: key })
        note(key, id)
        answers += 1
        if (answers === killAfterAnswers) child.kill('SIGKILL')
      })
      await Promise.allSettled(asked)
      await dead
    }
    expect(known.size).toBeGreaterThanOrEqual(15)
    const { port } = await start()
    const stripe = sdk(port)
    for (const key of keys) {
      const { id } = await stripe.paymentIntents.create(params, { idempotencyKey: key })
      note(key, id)
    }
    expect(changed).toEqual([])
    const kept = await stripe.paymentIntents.list({ limit: 100 })
    expect(kept.data).toHaveLength(keys.length)
  })

  it('stops on SIGTERM with code 0', async () => {
    const { child } = await start()
    const exit = exitOf(child)
    child.kill('SIGTERM')
    expect(await exit).toBe(0)
  })
})
