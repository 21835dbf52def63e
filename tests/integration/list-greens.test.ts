import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { listing } from '@/db/schema/listings'
import { setClockOffset } from '@/server/clock'
import { expireListings } from '@/server/listings/expire-listings'
import type { FieldProblem } from '@/shared/api/problem'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import { dayAt, lettuceOf } from '@/tests/support/greens'
import {
  begin,
  decide,
  openListingDesk,
  resubmit,
  submit,
  type Hatchery,
  type ListingDesk,
} from '@/tests/support/listing-desk'
import { keyed, TEST_NOW } from '@/tests/support/server'

const NOW = new Date(TEST_NOW)
const own = '/api/v1/sellers/mine/listings'

let desk: ListingDesk
let greta: Hatchery
let mo: TestAgent
beforeAll(async () => {
  desk = await openListingDesk('list_greens')
  greta = await desk.hatchery('greta@example.org')
  mo = await desk.moderator('mo@example.org')
})
afterAll(() => desk.close())

type Change = Partial<ProduceBody> & Record<string, unknown>
const typed = (change: Change = {}, by = greta) => ({ ...lettuceOf(NOW, by.photoId), ...change })
const sent = async (change: Change = {}, by = greta) => submit(by, await begin(by, typed(change, by)))
const pageOf = async (listingId: string) =>
  (await desk.visitor().get(`/api/v1/listings/${listingId}`).query({ near: '45202' })).body
const refused = async (change: Change) => {
  const answer = await sent(change)
  const errors = (answer.body.errors ?? []) as FieldProblem[]
  return {
    status: answer.status,
    pointers: errors.map((error) => error.pointer),
    said: JSON.stringify(errors),
  }
}
const findProduce = async () => {
  const query = { near: '45202', category: 'produce', withinKm: 400 }
  return (await desk.visitor().get('/api/v1/listings').query(query).expect(200)).body.items
}

describe('fourteen heads for tomorrow evening', () => {
  it('are on sale at once with lot code, unit price, sell-by and what every buyer reads', async () => {
    const answer = await sent()
    expect(answer.status, JSON.stringify(answer.body)).toBe(200)
    const { listingId } = answer.body
    expect(answer.body).toMatchObject({ state: 'live', title: 'Leaf lettuce', stock: { free: 14 } })
    const page = await pageOf(listingId)
    expect(page.body).toMatchObject({ lotCode: 'L-0115', sellBy: '2027-01-22' })
    expect(page.gate).toMatchObject({ status: 'allowed', buy: 'yes', ticks: [] })
    expect(page.gate.cautions.map(({ id }: { id: string }) => id)).toEqual(['G-9', 'G-13'])
    const tag = (await findProduce()).find((one: { listingId: string }) => one.listingId === listingId)
    expect(tag).toMatchObject({ category: 'produce', cropId: 'leaf_lettuce', soldBy: 'head', unitCents: 300 })
    expect(tag).not.toHaveProperty('sizeLoMm')
  })

  it('have a lot code of their own, also when two are sent in at the same moment', async () => {
    const drafts = [await begin(greta, typed()), await begin(greta, typed())]
    const answers = await Promise.all(drafts.map((draft) => submit(greta, draft)))
    expect(answers.map(({ status }) => status)).toEqual([200, 200])
    const codes = await Promise.all(
      drafts.map(async ({ listingId }) => (await pageOf(listingId)).body.lotCode),
    )
    expect(new Set(codes).size).toBe(2)
    expect(codes.toSorted()).toEqual(['L-0115-2', 'L-0115-3'])
    const taken = await refused({ lotCode: 'L-0115' })
    expect([taken.status, taken.pointers]).toEqual([422, ['#/draft/lotCode']])
  })

  it('keep their code through an edit, which is on sale at once too', async () => {
    const { body } = await sent({ harvest: { day: dayAt(NOW, -1), time: '08:00', bed: 'bed 3' } })
    const change = typed({
      harvest: { day: dayAt(NOW, -1), time: '08:00', bed: 'bed 3' },
      tiers: [{ fromCount: 1, unitCents: 250 }],
      growing: 'On rafts. No sprays.',
    })
    const edited = await resubmit(greta, body.listingId, change)
    expect(edited.body).toMatchObject({ state: 'live', liveVersion: 2 })
    expect((await pageOf(body.listingId)).body).toMatchObject({ lotCode: 'L-0114-B3' })
    const other = await resubmit(greta, body.listingId, {
      ...change,
      saleUnit: { kind: 'weight', netG: 200 },
    })
    expect([other.status, other.body.errors[0].pointer]).toEqual([422, '#/draft/saleUnit'])
  })

  it('leave the market by themselves when their last window has begun', async () => {
    const { body } = await sent()
    setClockOffset(NOW.getTime() + 2 * 86_400_000 - Date.now())
    await expireListings()
    const [row] = await desk.db.select().from(listing).where(eq(listing.publicId, body.listingId))
    expect(row?.state).toBe('expired')
    expect(await findProduce()).toEqual([])
    setClockOffset(NOW.getTime() - Date.now())
  })
})

describe('what asks for a paper', () => {
  it('holds cut greens with the reason until a moderator has accepted the licence, and then no more', async () => {
    const cut = {
      form: 'cut-mixed-or-washed' as const,
      saleUnit: { kind: 'weight' as const, netG: 227 },
      sellBy: dayAt(NOW, 3),
    }
    const held = await sent(cut)
    expect(held.body).toMatchObject({ state: 'pending_review' })
    expect(held.body.review.why[0]).toMatch(/food licence in most states/)
    expect((await desk.visitor().get(`/api/v1/listings/${held.body.listingId}`)).status).toBe(404)
    await (
      await decide(mo, held.body.listingId)
    ).ok
    expect((await sent(cut)).body.state).toBe('live')
    const leaves = await sent({ form: 'harvest-cut', saleUnit: { kind: 'weight', netG: 227 } })
    expect(leaves.body).toMatchObject({ state: 'live', title: 'Leaf lettuce, cut leaves' })
  })

  it('knows kangkong for water spinach: a moderator and a permit first, never over a state line', async () => {
    const spinach = {
      cropId: 'kangkong',
      saleUnit: { kind: 'weight' as const, netG: 227 },
      sellBy: dayAt(NOW, 3),
      words: 'State permit OH-2217.',
    }
    const held = await sent(spinach)
    expect(held.body).toMatchObject({ state: 'pending_review', title: 'Water spinach' })
    expect(held.body.review.why[0]).toMatch(/federal list of noxious weeds.*permit/)
    await (
      await decide(mo, held.body.listingId)
    ).ok
    const at = (near: string) => desk.visitor().get(`/api/v1/listings/${held.body.listingId}`).query({ near })
    expect((await at('45202')).body.gate).toMatchObject({ status: 'permit_both', buy: 'reserve-only' })
    const over = await at('40202')
    expect(over.status === 404 || over.body.gate.buy === 'no').toBe(true)
    const days = await desk
      .visitor()
      .get(`/api/v1/listings/${held.body.listingId}/ship-days`)
      .query({ near: '45202', quantity: 1 })
    expect([days.status, days.body.type]).toEqual([409, '/problems/not-shipped'])
  })

  it('asks a qualified exempt farm for its full address, which is then public', async () => {
    const bare = await refused({ standing: 'qualified-exempt' })
    expect([bare.status, bare.pointers]).toEqual([422, ['#/draft/farm']])
    expect(bare.said).toMatch(/full business address/)
    const farm = { name: 'Greta’s', street: '4 Kiln Rd', city: 'Oxford', state: 'OH', zip: '45056' }
    const { body } = await sent({ standing: 'qualified-exempt', farm })
    expect((await pageOf(body.listingId)).body.farm).toEqual(farm)
  })
})

describe('words and measures', () => {
  it.each<[string, Change, [pointer: string, words: RegExp]]>([
    [
      'kale by the bag',
      { cropId: 'kale', saleUnit: { kind: 'bag' } as never },
      ['#/draft/saleUnit', /net weight/],
    ],
    [
      'organic without a paper',
      { growing: 'Organic, on rafts.' },
      ['#/draft/growing', /without synthetic pesticides/],
    ],
    ['sprouts', { cropId: 'alfalfa sprouts' }, ['#/draft/cropId', /Sprouts are not sold here/]],
    ['a crop nobody knows', { cropId: 'moon cabbage' }, ['#/draft/cropId', /Ask us to add it/]],
    [
      'a harvest in a month',
      {
        harvest: { day: dayAt(NOW, 30), time: '07:00' },
        windows: [{ day: dayAt(NOW, 31), from: '17:00', until: '19:00', capacity: 4 }],
      },
      ['#/draft/harvest/day', /14 days ahead/],
    ],
    [
      'a harvest long past',
      {
        harvest: { day: dayAt(NOW, -30), time: '07:00' },
        windows: [{ day: dayAt(NOW, -29), from: '17:00', until: '19:00', capacity: 4 }],
      },
      ['#/draft/harvest/day', /last day of sale was/],
    ],
    ['a small order on credit', { depositPct: 20 }, ['#/draft/depositPct', /paid in full/]],
    ['a wish to ship', { shipping: {} }, ['#/draft', /Not expected here: shipping/]],
  ])('refuses %s at its field, with what to do', async (_name, change, [pointer, words]) => {
    const answer = await refused(change)
    expect(answer.status).toBe(422)
    expect(
      answer.pointers.some((one) => one.startsWith(pointer)),
      answer.said,
    ).toBe(true)
    expect(answer.said).toMatch(words)
  })

  it('prints the price by weight beside a pack', async () => {
    const { body } = await sent({
      cropId: 'kale',
      saleUnit: { kind: 'bunch', netG: 226.796185 },
      tiers: [{ fromCount: 1, unitCents: 450 }],
    })
    const tag = (await findProduce()).find((one: { listingId: string }) => one.listingId === body.listingId)
    expect(tag.comparable.us).toBe('$9.00/lb')
  })

  it('reads a plant named beside the crop first, and a fish in the name of a chard not at all', async () => {
    const watched = await sent({ words: 'Some water spinach grows beside it.' })
    expect(watched.body).toMatchObject({ state: 'pending_review' })
    expect(watched.body.review.why[0]).toMatch(/Water spinach/)
    const chard = {
      cropId: 'chard',
      variety: 'Rainbow trout lily',
      saleUnit: { kind: 'weight' as const, netG: 227 },
    }
    expect((await sent(chard)).body.state).toBe('live')
    const phone = await sent({ words: 'Call me, 513 555 0142 88.' })
    expect(phone.body).toMatchObject({ state: 'pending_review' })
  })

  it('begins the next harvest like this one, without what was said about this one', async () => {
    const { body } = await sent()
    const copy = await greta.agent.post(own).set(keyed()).send({ copyOf: body.listingId }).expect(201)
    expect(copy.body.draft).toMatchObject({ cropId: 'leaf_lettuce', tiers: [{ unitCents: 300 }] })
    for (const field of ['harvest', 'lotCode', 'sellBy', 'photos', 'windows', 'countOnHand'])
      expect(copy.body.draft).not.toHaveProperty(field)
  })
})
