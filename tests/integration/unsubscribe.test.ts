import { once } from 'node:events'
import { mkdtemp, rm } from 'node:fs/promises'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { openMailBox, type MailBox } from '@/server/mail/catcher/mail-box'
import { receiveMail } from '@/server/mail/catcher/receive-mail'
import type { Letter } from '@/server/mail/letter'
import { configureMail, sendMail } from '@/server/mail/send-mail'
import { writeUnsubscribeToken } from '@/server/mail/unsubscribe-token'
import { remindPickups } from '@/server/notices/remind-pickups'
import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { openPickupDesk, type PickupDesk } from '@/tests/support/pickup-desk'

let desk: PickupDesk
let box: MailBox
let folder: string
let smtp: ReturnType<typeof receiveMail>
let seq = 9_000_000

beforeAll(async () => {
  desk = await openPickupDesk('unsubscribe')
  folder = await mkdtemp(path.join(tmpdir(), 'tankward-test-mail-'))
  box = await openMailBox(folder)
  smtp = receiveMail(box)
  await once(smtp.listen(0, '127.0.0.1'), 'listening')
  const { port } = smtp.server.address() as AddressInfo
  configureMail({ smtpUrl: `smtp://127.0.0.1:${port}`, from: 'hello@tankward.example' })
})
afterAll(async () => {
  await new Promise<void>((done) => smtp.close(() => done()))
  await desk.close()
  await rm(folder, { recursive: true, force: true })
})

/** Sends a letter as the outbox does and gives it back as it arrived; null when it was held back. */
async function sent(letter: Letter) {
  const before = box.count()
  await sendMail({ seq: ++seq, kind: 'mail', ref: 0, body: { letter: { ...letter } }, attempts: 1 })
  if (box.count() === before) return null
  const [mail] = await box.list({ atMost: 1 })
  if (!mail) throw new Error('the mail was not kept')
  return { mail, raw: (await box.raw(mail.id))?.toString() ?? '' }
}

/** Bea's reminder of a pickup, two hours before. */
async function reminder(name: string): Promise<Letter> {
  const pickup = await desk.scheduled(name)
  const { slot } = await pickup.seen()
  await desk.travelToWithoutRest(new Date(Date.parse(slot?.startsAt ?? '') - 7_000_000))
  await remindPickups()
  await desk.quiet()
  await desk.travelToWithoutRest(new Date())
  const letter = desk.letters.findLast((one) => one.optional && one.to.email === 'bea@example.org')
  if (!letter) throw new Error('there was no reminder')
  return letter
}

const remindersOf = async () => {
  const bea = await desk.signedIn('bea@example.org')
  return ((await bea.get('/api/v1/me').expect(200)).body as { mail: { reminders: boolean } }).mail.reminders
}
const pathIn = (raw: string) => {
  const url = /^List-Unsubscribe: <(http[^>]+)>\r?$/m.exec(raw.replace(/\r\n[ \t]+/g, ' '))?.[1]
  if (!url) throw new Error('no List-Unsubscribe header')
  return new URL(url).pathname
}

describe('a mail that may be switched off', () => {
  it('carries both headers of one-click unsubscribe, and the link in both parts', async () => {
    const letter = await reminder('headers')
    const came = await sent(letter)
    const link = `http://127.0.0.1:8080${pathIn(came?.raw ?? '')}`
    expect(came?.mail.headers['list-unsubscribe-post']).toBe('List-Unsubscribe=One-Click')
    expect(came?.mail.text).toContain(link)
    expect(came?.mail.html).toContain(link)
  })

  it('is stopped by a POST of a mail program: no cookie, another origin, a form', async () => {
    const letter = await reminder('post')
    const address = pathIn((await sent(letter))?.raw ?? '')
    expect(await remindersOf()).toBe(true)
    for (const method of ['get', 'head'] as const) {
      const looked = await desk.visitor()[method](address)
      expect(looked.status).toBe(200)
      expect(looked.headers['content-security-policy']).toContain("default-src 'none'")
    }
    expect((await desk.visitor().get(address)).text).toContain('<form method="post"')
    expect(await remindersOf()).toBe(true)

    const reply = await desk
      .visitor()
      .post(address)
      .set({ origin: 'https://mail.example', 'sec-fetch-site': 'cross-site', 'x-tankward': '' })
      .type('form')
      .send('List-Unsubscribe=One-Click')
    expect(reply.status).toBe(200)
    expect(await remindersOf()).toBe(false)
    // Even the mail that was waiting is not sent any more.
    expect(await sent(letter)).toBeNull()

    const bea = await desk.signedIn('bea@example.org')
    const back = await bea.patch('/api/v1/me').send({ reminders: true }).expect(200)
    expect(back.body.mail.reminders).toBe(true)
    expect(await sent(letter)).not.toBeNull()
  })

  it('is not stopped by a link that we did not sign', async () => {
    const { memberId } = (await reminder('forged')).optional ?? { memberId: '' }
    const token = writeUnsubscribeToken({ list: 'reminders', memberId })
    const named = Buffer.from(`reminders:${memberId}`).toString('base64url')
    for (const forged of [token.slice(0, -2), `${named}.`, `${named}.${'A'.repeat(43)}`, 'junk']) {
      const reply = await desk.visitor().post(`/unsubscribe/${forged}`).type('form').send('a=1')
      expect(reply.status, forged).toBe(404)
    }
    expect(await remindersOf()).toBe(true)
  })

  it('opens no other door: the rest of the product still asks where a request comes from', async () => {
    const reply = await desk
      .visitor()
      .post('/api/v1/notices/readings')
      .set('origin', 'https://mail.example')
      .type('form')
      .send('List-Unsubscribe=One-Click')
    expect([reply.status, reply.body.type]).toEqual([403, '/problems/forged-request'])
  })

  it('still comes as a notice when the mail is off', async () => {
    const bea = await desk.signedIn('bea@example.org')
    await bea.patch('/api/v1/me').send({ reminders: false }).expect(200)
    expect(await sent(await reminder('notice-only'))).toBeNull()
    const { items } = (await bea.get('/api/v1/notices')).body as { items: { kind: string }[] }
    expect(items[0]?.kind).toBe('two-hours-before')
    await bea.patch('/api/v1/me').send({ reminders: true }).expect(200)
  })
})

describe('a mail about money or a changed order', () => {
  it('comes whatever was switched off, has no such headers, and brings its calendar file unharmed', async () => {
    const bea = await desk.signedIn('bea@example.org')
    await bea.patch('/api/v1/me').send({ reminders: false }).expect(200)
    await desk.scheduled('always')
    const letter = desk.letters.findLast((one) => one.to.email === 'bea@example.org')
    if (!letter?.calendar) throw new Error('the mail of the agreement has a calendar file')
    const came = await sent(letter)
    expect(came?.raw).not.toMatch(/^List-Unsubscribe/im)
    expect(came?.raw).toMatch(/text\/calendar; charset=utf-8; method=PUBLISH/i)
    const file = came?.mail.attachments.find((one) => one.name === 'pickup.ics')
    expect(file?.bytes).toBe(Buffer.byteLength(letter.calendar.text))
    const base64 = Buffer.from(letter.calendar.text).toString('base64')
    expect(came?.raw.replaceAll('\r\n', '')).toContain(base64)
    expect(calendarFaults(Buffer.from(letter.calendar.text))).toEqual([])
    await bea.patch('/api/v1/me').send({ reminders: true }).expect(200)
  })
})
