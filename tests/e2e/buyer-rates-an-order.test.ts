import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import type { OrderRow, ShownOrder } from '@/shared/contracts/orders'
import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { signInDemo } from '@/tests/support/demo-people'

const { origin, dataDir } = inject('wholeProduct')
const WORDS = 'Two herons and <b>lively</b> fish.'
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

describe('the beginner who has been handed fish', () => {
  it('gives marks and words that anybody reads on the seller’s page', async () => {
    const page = await browser.openPage({ width: 390, origin })
    await signInDemo(page, { dataDir, role: 'beginner' })
    const { items } = (await (await page.request.get('/api/v1/orders?as=buyer')).json()) as {
      items: OrderRow[]
    }
    const done = items.find((order) => order.may.some((act) => act === 'rate' || act === 'change-rating'))
    if (!done) throw new Error('the beginner has no order to rate')
    await page.goto(`/orders/${done.orderId}`)
    await page.getByRole('button', { name: /^(Rate this order|Change your rating)$/ }).click()
    const sheet = page.getByRole('dialog')
    await sheet.getByLabel('Fish quality').selectOption('4')
    await sheet.getByLabel('Honest count').selectOption('5')
    await sheet.getByLabel('Communication').selectOption('3')
    await sheet.getByLabel(/In your words/).fill(WORDS)
    await keepShot(page, 'rate-order-390')
    await expectNoAxeViolations(page)
    await sheet.getByRole('button', { name: /^(Give this rating|Save the change)$/ }).click()
    await sheet.waitFor({ state: 'detached' })
    await page.getByText(WORDS).waitFor()

    const order = (await (await page.request.get(`/api/v1/orders/${done.orderId}`)).json()) as ShownOrder
    const visitor = await browser.openPage({ width: 390, origin })
    await visitor.goto(`/sellers/${order.otherParty.sellerId}`)
    await visitor.getByText(WORDS).waitFor()
    await visitor.getByText('Communication 3 of 5').first().waitFor()
    expect(await visitor.getByText(order.rating?.buyerName ?? '?').count()).toBeGreaterThan(0)
    await keepShot(visitor, 'seller-ratings-390')
    await expectNoAxeViolations(visitor)
    for (const one of [page, visitor]) await one.context().close()
  })
})
