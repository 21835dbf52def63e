import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'

import { listPickups } from '@/server/notices/reminder-store'
import { remindPickups } from '@/server/notices/remind-pickups'
import type { ShownNotice } from '@/shared/contracts/notices'
import { openPickupDesk, type PickupDesk } from '@/tests/support/pickup-desk'

let desk: PickupDesk
beforeAll(async () => {
  desk = await openPickupDesk('remind_pickups')
})
afterEach(async () => {
  const bea = await desk.signedIn('bea@example.org')
  await bea.patch('/api/v1/me').send({ reminders: true, quiet: null }).expect(200)
})
afterAll(() => desk.close())

type Pickup = Awaited<ReturnType<PickupDesk['scheduled']>>
type Agent = Pickup['bea']

const window = (day: string, from: string, until: string) => ({ day, from, until, capacity: 4 })
const at = (text: string) => new Date(text)

/** What the job says at a moment. */
async function remindAt(moment: Date): Promise<void> {
  await desk.travelToWithoutRest(moment)
  await remindPickups()
  await desk.quiet()
}

async function kinds(by: Agent, { order }: Pickup): Promise<ShownNotice['kind'][]> {
  const { items } = (await by.get('/api/v1/notices?limit=50').expect(200)).body as { items: ShownNotice[] }
  return items
    .filter((one) => one.about.id === order.orderId && one.kind.includes('before'))
    .map((one) => one.kind)
    .toReversed()
}

const mailsAbout = ({ order }: Pickup) =>
  desk.letters.filter(
    (letter) =>
      letter.optional !== undefined &&
      letter.blocks.some((block) => block.kind === 'button' && block.url.includes(order.orderId)),
  )

/** A pickup at the hatchery in Ohio, agreed on well before. */
async function agreed(name: string, windows: ReturnType<typeof window>[], when: string) {
  await desk.travelToWithoutRest(at(when))
  return desk.scheduled(name, { windows })
}

describe('reminders of a pickup', () => {
  it.each([
    {
      name: 'the day the clocks go back',
      day: window('2026-11-01', '09:00', '10:00'),
      agreedAt: '2026-10-20T15:00:00Z',
      evening: '2026-10-31T22:00:00Z',
      shortly: '2026-11-01T12:00:00Z',
    },
    {
      name: 'the day the clocks go forward',
      day: window('2027-03-14', '09:00', '10:00'),
      agreedAt: '2027-03-01T15:00:00Z',
      evening: '2027-03-13T23:00:00Z',
      shortly: '2027-03-14T11:00:00Z',
    },
  ])('come once each to both parties: $name', async ({ name, day, agreedAt, evening, shortly }) => {
    const pickup = await agreed(name, [day], agreedAt)
    const { bea, hatchery } = pickup
    await remindAt(new Date(at(evening).getTime() - 60_000))
    expect(await kinds(bea, pickup)).toEqual([])
    await remindAt(at(evening))
    await Promise.all([remindPickups(), remindPickups(), remindPickups()])
    await desk.quiet()
    for (const by of [bea, hatchery]) expect(await kinds(by, pickup)).toEqual(['evening-before'])
    expect(
      mailsAbout(pickup)
        .map((letter) => letter.to.email)
        .toSorted(),
    ).toEqual(['bea@example.org', desk.hatcheryEmail])

    await remindAt(new Date(at(shortly).getTime() - 60_000))
    expect(await kinds(bea, pickup)).toHaveLength(1)
    await remindAt(at(shortly))
    await remindAt(new Date(at(shortly).getTime() + 600_000))
    for (const by of [bea, hatchery])
      expect(await kinds(by, pickup)).toEqual(['evening-before', 'two-hours-before'])
    expect(mailsAbout(pickup)).toHaveLength(4)
  })

  it('carry place and code to the buyer and the count to the seller', async () => {
    const pickup = await agreed('words', [window('2026-10-24', '09:00', '10:00')], '2026-10-20T15:00:00Z')
    await remindAt(at('2026-10-24T11:05:00Z'))
    const [toBuyer, toSeller] = ['bea@example.org', desk.hatcheryEmail].map((email) =>
      JSON.stringify(mailsAbout(pickup).find((letter) => letter.to.email === email)),
    )
    expect(toBuyer).toContain('12 Mill Lane')
    expect(toBuyer).toContain('six-digit code')
    expect(toSeller).toContain('25 animals')
    expect(toSeller).not.toContain('six-digit code')
  })

  it('begin anew for a pickup that was moved, and are silent about the old time', async () => {
    const days = [window('2026-09-12', '09:00', '10:00'), window('2026-09-14', '09:00', '10:00')]
    const pickup = await agreed('moved', days, '2026-09-05T15:00:00Z')
    const { bea, hatchery } = pickup
    await remindAt(at('2026-09-11T22:00:00Z'))
    expect(await kinds(bea, pickup)).toEqual(['evening-before'])
    await desk.travelToWithoutRest(at('2026-09-12T01:00:00Z'))
    await pickup.move()
    await remindAt(at('2026-09-12T11:30:00Z'))
    expect(await kinds(bea, pickup)).toEqual(['evening-before'])
    await remindAt(at('2026-09-13T22:00:00Z'))
    await remindAt(at('2026-09-14T11:00:00Z'))
    for (const by of [bea, hatchery])
      expect(await kinds(by, pickup)).toEqual(['evening-before', 'evening-before', 'two-hours-before'])
  })

  it('are never sent for a pickup that is off', async () => {
    const pickup = await agreed('off', [window('2026-09-19', '09:00', '10:00')], '2026-09-15T15:00:00Z')
    await pickup.act(pickup.bea, 'cancellation')
    await remindAt(at('2026-09-18T22:00:00Z'))
    await remindAt(at('2026-09-19T11:00:00Z'))
    expect(await kinds(pickup.bea, pickup)).toEqual([])
    expect(mailsAbout(pickup)).toEqual([])
    // The control: the one beside it, still on, was reminded.
    const other = await agreed('on', [window('2026-09-26', '09:00', '10:00')], '2026-09-20T15:00:00Z')
    await remindAt(at('2026-09-25T22:00:00Z'))
    expect(await kinds(other.bea, other)).toEqual(['evening-before'])
  })

  it('say nothing about a day that was agreed on after their time', async () => {
    const pickup = await agreed('late', [window('2026-08-08', '09:00', '10:00')], '2026-08-07T23:30:00Z')
    await remindAt(at('2026-08-07T23:40:00Z'))
    expect(await kinds(pickup.bea, pickup)).toEqual([])
    await remindAt(at('2026-08-08T11:00:00Z'))
    expect(await kinds(pickup.bea, pickup)).toEqual(['two-hours-before'])
  })

  it('wait for the end of the quiet hours of the member who wants them', async () => {
    const pickup = await agreed('quiet', [window('2026-08-15', '09:00', '10:00')], '2026-08-10T15:00:00Z')
    const { bea, hatchery } = pickup
    const quiet = { from: '17:30', until: '19:30', zone: 'America/New_York' }
    await bea.patch('/api/v1/me').send({ quiet }).expect(200)
    await remindAt(at('2026-08-14T22:00:00Z'))
    expect(await kinds(bea, pickup)).toEqual([])
    expect(await kinds(hatchery, pickup)).toEqual(['evening-before'])
    await remindAt(at('2026-08-14T23:30:00Z'))
    expect(await kinds(bea, pickup)).toEqual(['evening-before'])
    await bea
      .patch('/api/v1/me')
      .send({ quiet: { ...quiet, from: '05:00', until: '08:45' } })
      .expect(200)
    await remindAt(at('2026-08-15T11:00:00Z'))
    expect(await kinds(bea, pickup)).toEqual(['evening-before', 'two-hours-before'])
  })

  it('look only at pickups of the next hours', async () => {
    await agreed('far', [window('2026-08-29', '09:00', '10:00')], '2026-08-20T15:00:00Z')
    const from = at('2026-08-20T15:00:00Z')
    expect(await listPickups(from, at('2026-08-21T23:00:00Z'))).toEqual([])
    expect(await listPickups(from, at('2026-08-30T00:00:00Z'))).toHaveLength(1)
  })
})

describe('mail wishes', () => {
  it('refuse hours and zones that are none', async () => {
    const bea = await desk.signedIn('bea@example.org')
    for (const quiet of [
      { from: '25:00', until: '07:00', zone: 'America/New_York' },
      { from: '22:00', until: '22:00', zone: 'America/New_York' },
      { from: '22:00', until: '07:00', zone: 'Mars/Crater' },
    ])
      await bea.patch('/api/v1/me').send({ quiet }).expect(422)
    const kept = await bea
      .patch('/api/v1/me')
      .send({ quiet: { from: '22:00', until: '07:00', zone: 'America/Chicago' } })
    expect(kept.body.mail).toEqual({
      reminders: true,
      quiet: { from: '22:00', until: '07:00', zone: 'America/Chicago' },
    })
    const none = await bea.patch('/api/v1/me').send({ quiet: null })
    expect(none.body.mail).toEqual({ reminders: true })
  })
})
