import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { notice } from '@/db/schema/notices'
import { order as orderTable } from '@/db/schema/orders'
import { inTransaction } from '@/db/transaction'
import { queueOrderLetters } from '@/server/orders/queue-order-letters'
import type { ShownNotice } from '@/shared/contracts/notices'
import { openPickupDesk, type PickupDesk } from '@/tests/support/pickup-desk'
import { keyed } from '@/tests/support/order-desk'

let desk: PickupDesk
beforeAll(async () => {
  desk = await openPickupDesk('notices')
  await desk.member('eve@example.org')
})
afterAll(() => desk.close())

type Agent = Awaited<ReturnType<PickupDesk['signedIn']>>
const list = async (by: Agent, query = '') =>
  (await by.get(`/api/v1/notices${query}`).expect(200)).body as { items: ShownNotice[]; nextCursor?: string }
const unread = async (by: Agent) =>
  ((await by.get('/api/v1/notices/unread-count').expect(200)).body as { unread: number }).unread

describe('notices inside the product', () => {
  it('stand beside the mails of an order, one for each cause and party', async () => {
    const { order, bea, hatchery } = await desk.scheduled('beside')
    const [mine] = (await list(bea)).items
    expect(mine).toMatchObject({ kind: 'scheduled', about: { noun: 'order', id: order.orderId } })
    expect(mine?.readAt).toBeUndefined()
    const mail = desk.letters.findLast((letter) => letter.to.email === 'bea@example.org')
    expect(mine?.subject).toBe(mail?.subject)
    expect((await list(hatchery)).items[0]).toMatchObject({ kind: 'scheduled', about: { id: order.orderId } })
  })

  it('are written once however often the same change is told of', async () => {
    const { order } = await desk.scheduled('once')
    const [row] = await desk.db.select().from(orderTable).where(eq(orderTable.publicId, order.orderId))
    if (!row) throw new Error('no such order')
    const before = await desk.db.$count(notice)
    const mails = desk.letters.length
    for (let time = 0; time < 3; time++) await inTransaction((tx) => queueOrderLetters(tx, 'E14', row))
    await desk.quiet()
    expect(await desk.db.$count(notice)).toBe(before)
    expect(desk.letters.length).toBe(mails)
  })

  it('are not written when the change is rolled back', async () => {
    const { order } = await desk.scheduled('rolled-back')
    const [row] = await desk.db.select().from(orderTable).where(eq(orderTable.publicId, order.orderId))
    if (!row) throw new Error('no such order')
    const before = await desk.db.$count(notice)
    const failing = inTransaction(async (tx) => {
      await queueOrderLetters(tx, 'E22', { ...row, version: row.version + 1 })
      throw new Error('broken off')
    })
    await expect(failing).rejects.toThrow('broken off')
    expect(await desk.db.$count(notice)).toBe(before)
  })

  it('belong to their member alone', async () => {
    const { bea } = await desk.scheduled('alone')
    const eve = await desk.signedIn('eve@example.org')
    expect((await list(eve)).items).toEqual([])
    expect(await unread(eve)).toBe(0)
    const theirs = (await list(bea)).items[0]?.noticeId ?? ''
    const stolen = await eve.post(`/api/v1/notices/${theirs}/reading`)
    const never = await eve.post(`/api/v1/notices/${'A'.repeat(22)}/reading`)
    expect([stolen.status, never.status]).toEqual([404, 404])
    expect(stolen.body.detail).toBe(never.body.detail)
    await eve.post('/api/v1/notices/readings').expect(200)
    expect((await list(bea)).items[0]?.readAt).toBeUndefined()
    await desk.visitor().get('/api/v1/notices').expect(401)
  })

  it('are marked read one by one, twice without harm, and all at once', async () => {
    const { bea } = await desk.scheduled('read')
    const count = await unread(bea)
    expect(count).toBeGreaterThan(1)
    const first = (await list(bea)).items[0]?.noticeId ?? ''
    const once = await bea.post(`/api/v1/notices/${first}/reading`).expect(200)
    expect(once.body).toEqual({ unread: count - 1 })
    const readAt = (await list(bea)).items[0]?.readAt
    expect(readAt).toBeDefined()
    await bea.post(`/api/v1/notices/${first}/reading`).expect(200)
    expect((await list(bea)).items[0]?.readAt).toBe(readAt)
    await bea.post('/api/v1/notices/readings').expect(200)
    expect(await unread(bea)).toBe(0)
  })

  it('come page by page, newest first, none twice and none left out', async () => {
    const { bea } = await desk.scheduled('pages')
    const all = (await list(bea, '?limit=50')).items.map((one) => one.noticeId)
    const paged: string[] = []
    for (let cursor = '', at = 0; at < 50; at++) {
      const page = await list(bea, `?limit=2${cursor}`)
      paged.push(...page.items.map((one) => one.noticeId))
      if (!page.nextCursor) break
      cursor = `&cursor=${page.nextCursor}`
    }
    expect(paged).toEqual(all)
    expect(all.length).toBeGreaterThan(3)
    const times = (await list(bea, '?limit=50')).items.map((one) => one.createdAt)
    expect(times).toEqual(times.toSorted().toReversed())
    await bea.get('/api/v1/notices?cursor=junk').expect(400)
  })

  it('tell both of an end, and the seller who ended it too', async () => {
    const { order, bea, hatchery, path } = await desk.scheduled('ended')
    await hatchery.post(`${path}/cancellation`).set(keyed()).send({ reason: 'die-off' }).expect(200)
    await desk.quiet()
    for (const by of [bea, hatchery]) {
      expect((await list(by)).items[0]).toMatchObject({ kind: 'ended', about: { id: order.orderId } })
    }
  })
})
