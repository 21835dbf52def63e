import { eq, isNull, and, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'

import { order } from '@/db/schema/orders'
import { outbox } from '@/db/schema/outbox'
import { configuredPayments } from '@/payments/stripe'
import { transferGroupOf } from '@/payments/transfer-group'
import { configureMail } from '@/server/mail/send-mail'
import { registerDoers } from '@/server/outbox/doers'
import { runEffects } from '@/server/outbox/run-effects'
import { BOUNDARIES, ENDINGS, KINDS, prepare, type Flow } from '@/tests/checks/crash-flows'
import { brokenInvariants } from '@/tests/support/money-invariants'
import { isSlice, reportFigure } from '@/tests/support/report-figure'
import { openStandingDesk, type StandingDesk } from '@/tests/support/standing-desk'
import { freshDatabase } from '@/tests/support/test-database'

/** The planted fault, in this process only: keys that are new with every try, and one crash after the call. */
const planted = vi.hoisted(() => ({ keys: false, crashAt: '' }))

vi.mock('@/payments/transfer', async (original) => {
  const real = await original<typeof import('@/payments/transfer')>()
  const transfer: typeof real.transfer = (wanted) =>
    real.transfer(planted.keys ? { ...wanted, idempotencyKey: `once-${Math.random()}` } : wanted)
  return { ...real, transfer }
})
vi.mock('nodemailer', async (original) => {
  const real = await original<typeof import('nodemailer')>()
  const createTransport = (...asked: Parameters<typeof real.createTransport>) => {
    const line = real.createTransport(...asked)
    const send = line.sendMail.bind(line)
    const sendMail = (mail: Parameters<typeof send>[0]) =>
      send(planted.keys ? { ...mail, messageId: `<${Math.random()}@farms.test>` } : mail)
    return Object.assign(line, { sendMail })
  }
  return { ...real, default: { ...real.default, createTransport } }
})
vi.mock('@/server/outbox/fail-point', () => ({
  armFailPoint: () => undefined,
  failPoint: (name: string) => {
    if (name !== planted.crashAt) return
    planted.crashAt = ''
    throw new Error('the planted crash')
  },
}))

const CONVERGED_WITHIN_MS = 10_000
const POINTS = KINDS.flatMap((kind) => BOUNDARIES.map((boundary) => `${kind}:${boundary}`)).filter(
  (point) => !isSlice || point === 'capture-deposit:called',
)

let desk: StandingDesk
const flows = new Map<string, Flow>()
let controls: Flow[] = []

async function openEffects(): Promise<number> {
  return desk.db.$count(outbox, and(isNull(outbox.doneAt), isNull(outbox.deadAt)))
}

async function stateOf(orderId: string): Promise<string | undefined> {
  return (await desk.db.select().from(order).where(eq(order.publicId, orderId)))[0]?.state
}

/** Milliseconds until nothing waits any more and the order stands where it should. */
async function convergedAfter(flow: Flow): Promise<number> {
  const began = Date.now()
  const isDone = async () =>
    (await openEffects()) === 0 && (await stateOf(flow.orderId)) === ENDINGS[flow.kind].state
  while (!(await isDone())) {
    if (Date.now() - began > 3 * CONVERGED_WITHIN_MS) return Infinity
    await new Promise((done) => setTimeout(done, 50))
  }
  return Date.now() - began
}

/** What the processor has booked for an order, against what it should have; empty when both agree. */
async function moneyFaults({ kind, orderId }: Flow): Promise<string[]> {
  const { client } = configuredPayments()
  const group = transferGroupOf(orderId)
  const charges = (await client.charges.list({ transfer_group: group, limit: 100 })).data
  const refunds = await Promise.all(
    charges.map((charge) => client.refunds.list({ charge: charge.id, limit: 100 })),
  )
  const transfers = (await client.transfers.list({ transfer_group: group, limit: 100 })).data
  const captured = charges.filter((charge) => charge.captured)
  // A voided hold is a charge that gave back what it never took.
  const given = charges.flatMap((charge, at) => (charge.captured ? (refunds[at]?.data ?? []) : []))
  const books = {
    captured: captured.map((charge) => charge.amount_captured),
    refunded: given.map((one) => one.amount),
    transferred: transfers.map((one) => one.amount),
  }
  const { state, ...should } = ENDINGS[kind]
  const isRight = JSON.stringify(books) === JSON.stringify(should)
  const stands = await stateOf(orderId)
  return [
    ...(isRight
      ? []
      : [`${kind} ${orderId}: booked ${JSON.stringify(books)}, not ${JSON.stringify(should)}`]),
    ...(stands === state ? [] : [`${kind} ${orderId} is ${stands}, not ${state}`]),
  ]
}

/** Mails by their own names, which come from the outbox: one name a row is one mail to whoever reads it. */
async function mailCount() {
  const caught = await desk.mails.list({})
  const names = new Set(caught.map((mail) => mail.headers['message-id'] ?? mail.id))
  const rows = await desk.db.select({ seq: outbox.seq }).from(outbox).where(eq(outbox.kind, 'mail'))
  const wanted = rows.map(({ seq }) => [...names].find((name) => name.startsWith(`<effect-${seq}@`)))
  return {
    rows: rows.length,
    doubled: Math.max(0, names.size - rows.length),
    lost: wanted.filter((name) => name === undefined).length,
    deliveredAgain: caught.length - names.size,
  }
}

beforeAll(async () => {
  desk = await openStandingDesk(await freshDatabase('check_crash'))
  const server = await desk.start()
  for (const point of POINTS) {
    const [kind] = point.split(':')
    const known = KINDS.find((one) => one === kind)
    if (known) flows.set(point, await prepare(desk, known, point.replace(':', '-')))
  }
  controls = [
    await prepare(desk, 'transfer', 'control-transfer'),
    await prepare(desk, 'mail', 'control-mail'),
  ]
  await vi.waitFor(async () => expect(await openEffects()).toBe(0), { timeout: 20_000, interval: 100 })
  await server.kill()
})
afterAll(() => desk.close())

describe('a server that is killed in the middle of an effect', () => {
  it('carries on after its restart: nothing charged or sent twice, nothing lost', async () => {
    const slow: string[] = []
    const unreached: string[] = []
    let slowestMs = 0
    for (const [point, flow] of flows) {
      const armed = await desk.start({ environment: { FAIL_POINT: point } })
      await Promise.race([flow.press(armed.origin), armed.ended])
      const patience = new Promise<null>((done) => setTimeout(() => done(null), 12_000).unref())
      const how = await Promise.race([armed.ended, patience])
      if (how?.signal !== 'SIGKILL') unreached.push(point)
      await armed.kill()
      const again = await desk.start()
      const tookMs = await convergedAfter(flow)
      slowestMs = Math.max(slowestMs, tookMs)
      if (tookMs > CONVERGED_WITHIN_MS) slow.push(`${point}: ${tookMs} ms`)
      await again.kill()
    }
    const money = (await Promise.all([...flows.values()].map(moneyFaults))).flat()
    const mails = await mailCount()
    const broken = await brokenInvariants(desk.db)
    const dead = await desk.db.$count(outbox, sql`dead_at is not null`)
    const figures: [id: string, figure: number, bar: number | string, pass: boolean][] = [
      ['points', flows.size - unreached.length, POINTS.length, unreached.length === 0],
      ['converged-ms', slowestMs, CONVERGED_WITHIN_MS, slow.length === 0],
      ['money-faults', money.length, 0, money.length === 0],
      ['mails-doubled', mails.doubled, 0, mails.doubled === 0],
      ['mails-lost', mails.lost, 0, mails.lost === 0],
      ['mails-delivered-again-under-the-same-name', mails.deliveredAgain, 'for the record', true],
      ['invariants', broken.length, 0, broken.length === 0],
      ['effects-given-up', dead, 0, dead === 0],
    ]
    for (const [id, figure, bar, pass] of figures)
      await reportFigure({ id: `MON-5-${id}`, figure, bar, pass })
    expect({ unreached, slow, money, broken, dead }).toEqual({
      unreached: [],
      slow: [],
      money: [],
      broken: [],
      dead: 0,
    })
    expect(mails).toMatchObject({ doubled: 0, lost: 0 })
  })

  it('would be caught paying and writing twice if its keys were not kept', async () => {
    const server = await desk.start({ environment: { JOBS: 'off' } })
    registerDoers()
    configureMail({ smtpUrl: desk.smtpUrl, from: 'hello@farms.test' })
    const found: Record<string, number> = {}
    planted.keys = true
    for (const flow of controls) {
      planted.crashAt = `${flow.kind}:called`
      await flow.press(server.origin)
      const before = (await mailCount()).doubled
      await runEffects()
      await desk.db.update(outbox).set({ runAfter: new Date() }).where(isNull(outbox.doneAt))
      await runEffects()
      const faults = await moneyFaults(flow)
      found[flow.kind] = flow.kind === 'mail' ? (await mailCount()).doubled - before : faults.length
    }
    planted.keys = false
    const missed = Object.values(found).filter((count) => count < 1).length
    const figure = controls.length - missed
    await reportFigure({ id: 'MON-5-control', figure, bar: controls.length, pass: missed === 0 })
    expect(missed, JSON.stringify(found)).toBe(0)
  })
})
