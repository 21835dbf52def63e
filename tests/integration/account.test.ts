import { eq } from 'drizzle-orm'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'

import { user } from '@/db/schema/auth'
import { outbox } from '@/db/schema/outbox'
import { BUILT_PASSWORD, buildMember } from '@/seed/build-member'
import type { Letter } from '@/server/mail/letter'
import type { ShownSession } from '@/shared/contracts/sessions'
import { openTestServer, type TestServer } from '@/tests/support/server'

const FIREFOX = 'Mozilla/5.0 (Windows NT 10.0; Win64; x64; rv:128.0) Gecko/20100101 Firefox/128.0'
const NEW_PASSWORD = 'saddle thicket ember 9'

let server: TestServer
let count = 0
let email = ''
let memberId = ''
let here: TestAgent
let elsewhere: TestAgent

beforeAll(async () => {
  server = await openTestServer('account')
})
afterAll(() => server.close())
beforeEach(async () => {
  email = `ann-${++count}@example.org`
  memberId = (await buildMember(server.db, { email, name: 'Ann Reed' })).memberId
  here = await signIn(BUILT_PASSWORD, FIREFOX)
  elsewhere = await signIn(BUILT_PASSWORD, 'curl/8.0')
})

async function signIn(password: string, agent = FIREFOX, to = email): Promise<TestAgent> {
  const by = server.visitor().set('user-agent', agent) as unknown as TestAgent
  await by.post('/api/auth/sign-in/email').send({ email: to, password }).expect(200)
  return by
}

const sessions = async (by: TestAgent) =>
  (await by.get('/api/v1/me/sessions').expect(200)).body.items as ShownSession[]
const isSignedIn = async (by: TestAgent) => (await by.get('/api/v1/me')).body !== null
const letters = async (to: string) =>
  (await server.db.select().from(outbox).where(eq(outbox.kind, 'mail')))
    .map((row) => row.body.letter as Letter)
    .filter((letter) => letter.to.email === to)
const linkOf = (letter: Letter | undefined) => {
  const button = letter?.blocks.find((block) => block.kind === 'button')
  if (button?.kind !== 'button') throw new Error('the mail has no link')
  const url = new URL(button.url)
  return `${url.pathname}${url.search}`
}
const ownEmail = async () =>
  (await server.db.select({ email: user.email }).from(user).where(eq(user.id, memberId)))[0]?.email

describe('where a member is signed in', () => {
  it('lists devices in words, this one first, and no token', async () => {
    const answer = await here.get('/api/v1/me/sessions').expect(200)
    const items = answer.body.items as ShownSession[]
    expect(items.map((one) => [one.device, one.isThis])).toEqual([
      ['Firefox on Windows', true],
      ['An unknown device', false],
    ])
    expect(Object.keys(items[0] ?? {}).sort()).toEqual(
      ['device', 'isThis', 'lastUsedAt', 'sessionId', 'startedAt'].sort(),
    )
    expect(answer.headers['cache-control']).toBe('no-store')
    await server.visitor().get('/api/v1/me/sessions').expect(401)
  })

  it('ends one: its old cookie opens nothing', async () => {
    const other = (await sessions(here)).find((one) => !one.isThis)
    await elsewhere.get('/api/v1/me/sessions').expect(200)
    await here.delete(`/api/v1/me/sessions/${other?.sessionId}`).expect(204)
    await elsewhere.get('/api/v1/me/sessions').expect(401)
    expect(await isSignedIn(here)).toBe(true)
    await here.delete(`/api/v1/me/sessions/${other?.sessionId}`).expect(404)
  })

  it('ends all others and keeps this one', async () => {
    const third = await signIn(BUILT_PASSWORD)
    await here.delete('/api/v1/me/sessions').expect(204)
    for (const old of [elsewhere, third]) await old.get('/api/v1/me/sessions').expect(401)
    expect(await sessions(here)).toHaveLength(1)
  })

  it('refuses the ids of other people, and leaves them signed in', async () => {
    const stranger = await buildMember(server.db, { email: `stranger-${count}@example.org` })
    const theirs = await signIn(BUILT_PASSWORD, FIREFOX, stranger.email)
    const [their] = await sessions(theirs)
    await here.delete(`/api/v1/me/sessions/${their?.sessionId}`).expect(404)
    await here.delete('/api/v1/me/sessions').expect(204)
    expect(await isSignedIn(theirs)).toBe(true)
  })

  it('gives no session token to scripts', async () => {
    for (const path of ['list-sessions', 'revoke-session', 'revoke-sessions', 'revoke-other-sessions']) {
      expect((await here.get(`/api/auth/${path}`)).status, path).toBe(404)
      expect((await here.post(`/api/auth/${path}`).send({})).status, path).toBe(404)
    }
  })
})

describe('a new password', () => {
  const change = (by: TestAgent, body: object) => by.post('/api/auth/change-password').send(body)

  it('needs the current one', async () => {
    const wrong = await change(here, { currentPassword: 'not the password', newPassword: NEW_PASSWORD })
    expect([wrong.status, wrong.body.code]).toEqual([400, 'INVALID_PASSWORD'])
    expect(await isSignedIn(elsewhere)).toBe(true)
    await signIn(BUILT_PASSWORD)
    expect(await letters(email)).toEqual([])
    expect(
      (await change(server.visitor(), { currentPassword: BUILT_PASSWORD, newPassword: NEW_PASSWORD })).status,
    ).toBe(401)
  })

  it.each(['short', 'password1234', 'ann-reed-is-ann'])('refuses %s', async (newPassword) => {
    const own = newPassword.startsWith('ann') ? `${email.split('@')[0]}-pond` : newPassword
    const refused = await change(here, { currentPassword: BUILT_PASSWORD, newPassword: own })
    expect(['PASSWORD_TOO_SHORT', 'PASSWORD_TOO_COMMON']).toContain(refused.body.code)
    await signIn(BUILT_PASSWORD)
  })

  it('signs out everybody else, even when the caller does not ask for it', async () => {
    const body = { currentPassword: BUILT_PASSWORD, newPassword: NEW_PASSWORD, revokeOtherSessions: false }
    const caller = server.visitor().set('user-agent', FIREFOX) as unknown as TestAgent
    const signed = await caller
      .post('/api/auth/sign-in/email')
      .send({ email, password: BUILT_PASSWORD })
      .expect(200)
    const cookie = ([signed.headers['set-cookie']].flat() as string[])
      .map((one) => one.split(';')[0])
      .join('; ')
    const withOldCookie = () => server.visitor().get('/api/v1/me/sessions').set('cookie', cookie)
    expect((await withOldCookie()).status).toBe(200)
    await change(caller, body).expect(200)
    for (const by of [here, elsewhere]) await by.get('/api/v1/me/sessions').expect(401)
    expect((await withOldCookie()).status).toBe(401)
    const [only, ...more] = await sessions(caller)
    expect([only?.device, more.length]).toEqual(['Firefox on Windows', 0])
    const old = await server
      .visitor()
      .post('/api/auth/sign-in/email')
      .send({ email, password: BUILT_PASSWORD })
    expect(old.status).toBe(401)
    await signIn(NEW_PASSWORD)
    expect((await letters(email)).map((letter) => letter.subject)).toEqual([
      'Your Tankward password was changed',
    ])
  })
})

describe('a new e-mail address', () => {
  const change = (by: TestAgent, newEmail: string, currentPassword?: string) =>
    by.post('/api/auth/change-email').send({
      newEmail,
      callbackURL: '/verify-email?returnTo=/account',
      ...(currentPassword === undefined ? {} : { currentPassword }),
    })

  it('needs the current password', async () => {
    for (const password of [undefined, '', 'not the password', NEW_PASSWORD]) {
      const wrong = await change(here, `new-${count}@example.org`, password)
      expect([wrong.status, wrong.body.code], password).toEqual([400, 'INVALID_PASSWORD'])
    }
    expect((await change(server.visitor(), `new-${count}@example.org`, BUILT_PASSWORD)).status).toBe(401)
    expect(await letters(`new-${count}@example.org`)).toEqual([])
    expect(await letters(email)).toEqual([])
  })

  it('takes effect with the link in the mail to the new address, once; the old address is told', async () => {
    const fresh = `new-${count}@example.org`
    await change(here, fresh, BUILT_PASSWORD).expect(200)
    expect(await ownEmail()).toBe(email)
    await server
      .visitor()
      .post('/api/auth/sign-in/email')
      .send({ email: fresh, password: BUILT_PASSWORD })
      .expect(401)
    const [told] = await letters(email)
    expect(told?.subject).toBe('Your Tankward account is to get another e-mail address')
    expect(JSON.stringify(told)).not.toContain('token=')
    const [asked, ...more] = await letters(fresh)
    expect([asked?.subject, more.length]).toEqual(['Confirm your new e-mail address for Tankward', 0])

    const link = linkOf(asked)
    const forged = link.replace(/token=([^&]{20})/, 'token=AAAA$1')
    const refused = await here.get(forged)
    expect(refused.headers.location).toContain('error=')
    expect(await ownEmail()).toBe(email)
    const opened = await here.get(link).expect(302)
    expect(opened.headers.location).toBe('/verify-email?returnTo=/account')
    expect(await ownEmail()).toBe(fresh)
    await signIn(BUILT_PASSWORD, FIREFOX, fresh)
    expect((await here.get(link)).headers.location).toContain('error=')
  })

  it('cannot be confirmed by another member’s browser', async () => {
    const stranger = await buildMember(server.db, { email: `other-${count}@example.org` })
    const theirs = await signIn(BUILT_PASSWORD, FIREFOX, stranger.email)
    await change(here, `new-${count}@example.org`, BUILT_PASSWORD).expect(200)
    const [asked] = await letters(`new-${count}@example.org`)
    await theirs.get(linkOf(asked))
    expect(await ownEmail()).toBe(email)
  })

  it('answers alike for an address that is taken: who has an account stays private', async () => {
    const taken = `taken-${count}@example.org`
    await buildMember(server.db, { email: taken })
    const one = await change(here, taken, BUILT_PASSWORD)
    const two = await change(here, `free-${count}@example.org`, BUILT_PASSWORD)
    expect([one.status, one.body]).toEqual([two.status, two.body])
    expect((await letters(email)).map((letter) => letter.subject)).toEqual([
      'Your Tankward account is to get another e-mail address',
      'Your Tankward account is to get another e-mail address',
    ])
    const [warned, ...more] = await letters(taken)
    expect([warned?.subject, more.length]).toEqual([
      'Your e-mail address was named for another Tankward account',
      0,
    ])
    expect(JSON.stringify(warned)).not.toContain('token=')
  })

  it('is not guessed at without end', async () => {
    const answers = []
    for (let tries = 0; tries < 8; tries++)
      answers.push((await change(here, 'x@example.org', 'wrong')).status)
    expect(answers.slice(0, 6)).toEqual(Array(6).fill(400))
    expect(answers.slice(6)).toEqual([429, 429])
  })
})

describe('signing in before the address is confirmed', () => {
  it('mails a link that ends on the page made for it', async () => {
    const unconfirmed = `unconfirmed-${count}@example.org`
    await buildMember(server.db, { email: unconfirmed, emailVerified: false })
    const body = { email: unconfirmed, password: BUILT_PASSWORD, callbackURL: '/verify-email' }
    const refused = await server.visitor().post('/api/auth/sign-in/email').send(body)
    expect([refused.status, refused.body.code]).toEqual([403, 'EMAIL_NOT_VERIFIED'])
    const [asked] = await letters(unconfirmed)
    expect(asked?.subject).toBe('Confirm your e-mail address for Tankward')
    const opened = await server.visitor().get(linkOf(asked)).expect(302)
    expect(opened.headers.location).toBe('/verify-email')
  })
})
