import { randomUUID } from 'node:crypto'

import type TestAgent from 'supertest/lib/agent'

import type { ShownOrder } from '@/shared/contracts/orders'
import { reserveBody } from '@/tests/support/desk-ground'
import type { StandingDesk } from '@/tests/support/standing-desk'

export const KINDS = ['capture-deposit', 'transfer', 'refund', 'mail', 'void-authorisation'] as const
export type Kind = (typeof KINDS)[number]

/** Where the process is killed: in the claim, after it, after the call outside, after the commit. */
export const BOUNDARIES = ['claiming', 'claimed', 'called', 'done'] as const
export type Boundary = (typeof BOUNDARIES)[number]

/** What the order and the processor's books must show in the end, US cents. */
export interface Ending {
  state: ShownOrder['state']
  captured: number[]
  refunded: number[]
  transferred: number[]
}

export const ENDINGS: Record<Kind, Ending> = {
  'capture-deposit': { state: 'scheduled', captured: [625], refunded: [], transferred: [] },
  'void-authorisation': { state: 'cancelled', captured: [], refunded: [], transferred: [] },
  transfer: { state: 'settled', captured: [2500], refunded: [], transferred: [2350] },
  refund: { state: 'cancelled', captured: [625], refunded: [625], transferred: [] },
  mail: { state: 'ready', captured: [625], refunded: [], transferred: [] },
}

export interface Flow {
  kind: Kind
  orderId: string
  /** The press that queues the effect. The server may die under it. */
  press: (origin: string) => Promise<void>
}

interface People {
  buyer: TestAgent
  seller: TestAgent
}

const keyed = () => ({ 'idempotency-key': randomUUID() })

async function until(what: string, isThere: () => Promise<boolean>): Promise<void> {
  const last = Date.now() + 20_000
  while (!(await isThere())) {
    if (Date.now() > last) throw new Error(`never came: ${what}`)
    await new Promise((done) => setTimeout(done, 60))
  }
}

async function act(by: TestAgent, address: string, send: object = {}): Promise<void> {
  const reply = await by.post(address).set(keyed()).send(send)
  if (!reply.ok) throw new Error(`${address}: ${reply.status} ${reply.text}`)
}

async function handOver({ buyer, seller }: People, address: string): Promise<void> {
  await act(seller, `${address}/readiness`)
  const { handOverCode: code } = (await buyer.get(address)).body as ShownOrder
  await act(seller, `${address}/hand-over`, { code, count: 25 })
}

const PRESSES: Record<Kind, [by: keyof People, what: string, send: object]> = {
  'capture-deposit': ['seller', 'acceptance', {}],
  'void-authorisation': ['seller', 'refusal', { reason: 'sick' }],
  transfer: ['buyer', 'confirmation', {}],
  refund: ['buyer', 'cancellation', {}],
  mail: ['seller', 'readiness', {}],
}

/** Brings an order of its own buyer to where one press queues an effect of this kind. */
export async function prepare(desk: StandingDesk, kind: Kind, name: string): Promise<Flow> {
  const asks = kind === 'capture-deposit' || kind === 'void-authorisation'
  const [cookie = ''] = await desk.cookies([`${name}@example.org`])
  const hatcheryCookie = await desk.cookieOf(desk.hatchery.memberId)
  const server = { origin: desk.origin }
  const people = { buyer: desk.agent(server, cookie), seller: desk.agent(server, hatcheryCookie) }
  const batch = await desk.batch(name, { body: { accept: asks ? 'ask' : 'instant' } })
  const body = reserveBody(batch, { payMode: kind === 'transfer' ? 'full' : 'deposit' })
  const held = await people.buyer.post(`/api/v1/listings/${batch.publicId}/orders`).set(keyed()).send(body)
  const { orderId, payUrl } = held.body as ShownOrder
  if (!payUrl) throw new Error(`no payment page: ${held.text}`)
  await desk.fake.pay(payUrl, '4242424242424242')
  const address = `/api/v1/orders/${orderId}`
  const paid = asks ? 'requested' : 'scheduled'
  await until(`${name} is ${paid}`, async () => (await people.buyer.get(address)).body.state === paid)
  if (kind === 'transfer') await handOver(people, address)
  const [by, what, send] = PRESSES[kind]
  return {
    kind,
    orderId,
    press: async (origin) => {
      const agent = desk.agent({ origin }, by === 'buyer' ? cookie : hatcheryCookie)
      await agent
        .post(`${address}/${what}`)
        .set(keyed())
        .send(send)
        .catch(() => undefined)
    },
  }
}
