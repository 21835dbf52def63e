import { createHash } from 'node:crypto'
import Stripe from 'stripe'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startTestFake, type TestFake } from '../fake-for-tests'

let fake: TestFake
let stripe: Stripe

beforeAll(async () => {
  fake = await startTestFake()
  stripe = new Stripe('sk_test_x', { host: '127.0.0.1', port: fake.port, protocol: 'http', telemetry: false })
})
afterAll(() => fake.stop())

async function openPage(capture: 'automatic' | 'manual' = 'automatic'): Promise<{ id: string; url: string }> {
  const session = await stripe.checkout.sessions.create({
    mode: 'payment',
    line_items: [
      {
        quantity: 1,
        price_data: {
          currency: 'usd',
          unit_amount: 1335,
          product_data: { name: 'Deposit for 60 <b>bluegill</b>' },
        },
      },
    ],
    payment_intent_data: { capture_method: capture },
    success_url: 'http://platform.test/orders/7?paid={CHECKOUT_SESSION_ID}',
    cancel_url: 'http://platform.test/orders/7',
  })
  if (!session.url) throw new Error('the page has no address')
  return { id: session.id, url: session.url }
}

describe('the practice payment page', () => {
  it('shows what is paid, escapes it, says that it is practice, and runs no script', async () => {
    const { url } = await openPage()
    const answer = await fetch(url)
    const text = await answer.text()
    expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'")
    expect(answer.headers.get('content-security-policy')).toContain('http://platform.test')
    expect(text).toContain('Pay $13.35')
    expect(text).toContain('60 &lt;b&gt;bluegill&lt;/b&gt;')
    expect(text).toContain('No real card is charged here')
    expect(text.match(/<h1>/g)).toHaveLength(1)
    expect(text).not.toContain('<script')
    expect(text).toContain('href="http://platform.test/orders/7"')
  })

  it('carries a style that its own policy lets through', async () => {
    const { url } = await openPage()
    const answer = await fetch(url)
    const css = /<style>([\s\S]*)<\/style>/.exec(await answer.text())?.[1] ?? ''
    const hash = createHash('sha256').update(css).digest('base64')
    expect(answer.headers.get('content-security-policy')).toContain(`'sha256-${hash}'`)
  })

  it('takes the money and sends the buyer back with the session named', async () => {
    const { id, url } = await openPage()
    const { status, next } = await fake.pay(url, '4242 4242 4242 4242')
    expect(status).toBe(303)
    expect(next).toBe(`http://platform.test/orders/7?paid=${id}`)
    const session = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent', 'line_items'] })
    expect(session).toMatchObject({
      status: 'complete',
      payment_status: 'paid',
      payment_intent: { status: 'succeeded', amount_received: 1335 },
      line_items: { data: [{ quantity: 1, amount_total: 1335 }] },
      url: null,
    })
  })

  it('pressed twice charges once', async () => {
    const { id, url } = await openPage()
    const [first, second] = await Promise.all([
      fake.pay(url, '4242424242424242'),
      fake.pay(url, '4242424242424242'),
    ])
    expect(first.next).toBe(second.next)
    const session = await stripe.checkout.sessions.retrieve(id)
    const charges = await stripe.charges.list({ payment_intent: String(session.payment_intent) })
    expect(charges.data).toHaveLength(1)
  })

  it('only holds the amount when the seller has yet to accept', async () => {
    const { id, url } = await openPage('manual')
    expect(await (await fetch(url)).text()).toContain('Hold $13.35')
    await fake.pay(url, '4242424242424242')
    const session = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] })
    expect(session).toMatchObject({
      status: 'complete',
      payment_status: 'unpaid',
      payment_intent: { status: 'requires_capture', amount_capturable: 1335, amount_received: 0 },
    })
  })

  it('says field by field what to mend, keeps name and date, and never writes an unknown number back', async () => {
    const { url } = await openPage()
    const typed = { cardNumber: '5555 5555', expiry: '01/20', cvc: 'x', name: 'Ada Marsh' }
    const { status, text } = await fake.submit(url, typed)
    expect(status).toBe(422)
    expect(text).toContain('3 fields need another look.')
    expect(text).toContain('This date is past.')
    expect(text).toContain('value="Ada Marsh"')
    expect(text).not.toContain('5555 5555"')
    expect(text.match(/aria-invalid="true"/g)).toHaveLength(3)
  })

  it('refuses a number that is no practice card and keeps no trace of it', async () => {
    const { id, url } = await openPage()
    const { status, text } = await fake.pay(url, '4111111111111111')
    expect(status).toBe(402)
    expect(text).toContain('Only the practice cards')
    expect(text).not.toContain('4111')
    const session = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] })
    expect(JSON.stringify(session)).not.toContain('4111')
  })

  it('can be paid with another card after a decline', async () => {
    const { id, url } = await openPage()
    const declined = await fake.pay(url, '4000000000009995')
    expect(declined.status).toBe(402)
    expect(declined.text).toContain('insufficient funds')
    expect((await fake.pay(url, '4242424242424242')).status).toBe(303)
    const session = await stripe.checkout.sessions.retrieve(id)
    const charges = await stripe.charges.list({ payment_intent: String(session.payment_intent) })
    expect(charges.data.map((charge) => charge.status)).toEqual(['succeeded', 'failed'])
  })

  it('asks the bank where the card wants it, and goes on by its answer', async () => {
    const approved = await openPage('manual')
    const challenge = await fake.pay(approved.url, '4000002760003184')
    expect(challenge.next).toMatch(/^\/challenge\/pi_/)
    expect(await (await fetch(`${fake.origin}${challenge.next}`)).text()).toContain(
      'Do you approve this payment?',
    )
    const { next } = await fake.submit(`${fake.origin}${challenge.next}`, { verdict: 'approve' })
    expect(next).toBe(`http://platform.test/orders/7?paid=${approved.id}`)

    const refused = await openPage()
    const asked = await fake.pay(refused.url, '4000002760003184')
    const back = await fake.submit(`${fake.origin}${asked.next}`, { verdict: 'refuse' })
    expect(back.next).toBe(`/pay/${refused.id}`)
    expect(await (await fetch(refused.url)).text()).toContain('not approved with the bank')

    const declined = await openPage()
    const askedToo = await fake.pay(declined.url, '4000008400001629')
    await fake.submit(`${fake.origin}${askedToo.next}`, { verdict: 'approve' })
    expect(await (await fetch(declined.url)).text()).toContain('Your card was declined.')
    expect((await stripe.checkout.sessions.retrieve(declined.id)).status).toBe('open')
  })

  it('closed, it takes no money and leads back', async () => {
    const { id, url } = await openPage()
    await stripe.checkout.sessions.expire(id)
    const { status, text } = await fake.pay(url, '4242424242424242')
    expect(status).toBe(410)
    expect(text).toContain('Nothing was charged.')
    expect((await stripe.checkout.sessions.retrieve(id)).payment_intent).toBeNull()
  })

  it('keeps a bank question open no longer than the page', async () => {
    const { id, url } = await openPage()
    const { next } = await fake.pay(url, '4000002760003184')
    await stripe.checkout.sessions.expire(id)
    const late = await fake.submit(`${fake.origin}${next}`, { verdict: 'approve' })
    expect(late.next).toBe(`/pay/${id}`)
    const session = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] })
    expect(session).toMatchObject({ status: 'expired', payment_intent: { status: 'canceled' } })
  })

  it('refuses to be opened for less than 30 minutes or more than a day', async () => {
    const nowS = Math.floor(Date.now() / 1000)
    const params: Stripe.Checkout.SessionCreateParams = {
      mode: 'payment',
      line_items: [
        {
          quantity: 1,
          price_data: { currency: 'usd', unit_amount: 1335, product_data: { name: 'Deposit' } },
        },
      ],
      success_url: 'http://platform.test/',
    }
    for (const minutes of [15, 29, 25 * 60]) {
      const short = stripe.checkout.sessions.create({ ...params, expires_at: nowS + minutes * 60 })
      await expect(short).rejects.toMatchObject({ param: 'expires_at' })
    }
    const open = await stripe.checkout.sessions.create({ ...params, expires_at: nowS + 31 * 60 })
    await fake.control('clock', { offsetMs: 32 * 60_000 })
    expect((await stripe.checkout.sessions.retrieve(open.id)).status).toBe('expired')
    await fake.control('clock', { offsetMs: 0 })
  })

  it('knows only its own addresses', async () => {
    expect((await fetch(`${fake.origin}/pay/cs_test_none`)).status).toBe(404)
    expect((await fetch(`${fake.origin}/admin`)).status).toBe(404)
  })
})
