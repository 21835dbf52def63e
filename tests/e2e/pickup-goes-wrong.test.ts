import type { Page } from 'playwright-core'
import { afterAll, beforeAll, expect, inject, it } from 'vitest'

import { connect, disconnect } from '@/db/client'
import { printCents } from '@/shared/units/money'
import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { demoOrder, moveSlot, type DemoOrder } from '@/tests/support/demo-orders'
import { signInNeighbour } from '@/tests/support/demo-people'
import { waitForMail } from '@/tests/support/mailbox'

const { origin, mailOrigin, databaseUrl, clockOffsetMs, dataDir } = inject('wholeProduct')
let browser: TestBrowser
beforeAll(async () => {
  connect(databaseUrl)
  browser = await openBrowser()
})
afterAll(async () => {
  await browser.close()
  await disconnect()
})

async function openOrder({ orderId }: DemoOrder, email: string): Promise<Page> {
  const page = await browser.openPage({ width: 390, origin })
  await signInNeighbour(page, { dataDir, email })
  await page.goto(`/orders/${orderId}`)
  await page.getByRole('heading', { level: 1 }).waitFor()
  return page
}

async function press(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name, exact: true }).filter({ visible: true }).last().click()
}

async function cancel(page: Page, told: string): Promise<void> {
  await press(page, 'Cancel the order')
  const dialog = page.getByRole('dialog')
  await dialog.getByText(told).waitFor()
  await expectNoAxeViolations(page)
  await dialog.getByRole('button', { name: 'Cancel the order', exact: true }).click()
  await dialog.waitFor({ state: 'hidden' })
  await page.getByRole('button', { name: 'Cancel the order' }).waitFor({ state: 'hidden' })
}

it('a buyer cancels in the free time and gets everything back', async () => {
  const order = await demoOrder({ state: 'scheduled', isBalancePaid: false })
  await moveSlot(order.orderId, 30 * 24, clockOffsetMs)
  const page = await openOrder(order, order.buyerEmail)
  const since = new Date()
  await cancel(page, `You get ${printCents(order.paidCents)} back.`)
  await expectNoAxeViolations(page)
  await keepShot(page, 'cancelled-free')
  const mail = await waitForMail(mailOrigin, {
    to: order.buyerEmail,
    since,
    subject: 'The order was cancelled',
  })
  expect(mail.text).toContain(printCents(order.paidCents))
})

it('a buyer who cancels late is told what the seller keeps before pressing', async () => {
  const order = await demoOrder({ state: 'scheduled', isBalancePaid: false })
  await moveSlot(order.orderId, 20, clockOffsetMs)
  const page = await openOrder(order, order.buyerEmail)
  const back = printCents(order.paidCents - order.depositCents)
  await cancel(page, `the seller keeps ${printCents(order.depositCents)}, you get ${back} back.`)
  await keepShot(page, 'cancelled-late')
})

async function sayNoShow(page: Page, act: string): Promise<void> {
  await press(page, act)
  await page
    .getByRole('dialog')
    .getByRole('textbox', { name: 'What happened' })
    .fill('Waited at the gate for the whole window.')
  await expectNoAxeViolations(page)
  await press(page, 'Say so')
  await page.getByRole('dialog').waitFor({ state: 'hidden' })
}

it('a seller says that the buyer did not come, and the buyer objects', async () => {
  const order = await demoOrder({ state: 'ready', isBalancePaid: true })
  await moveSlot(order.orderId, -2.5, clockOffsetMs)
  const seller = await openOrder(order, order.sellerEmail)
  await sayNoShow(seller, 'The buyer did not come')
  await seller.getByText('The seller says the buyer did not come').waitFor()
  await expectNoAxeViolations(seller)

  const buyer = await openOrder(order, order.buyerEmail)
  await buyer.getByText('The seller says the buyer did not come').waitFor()
  await press(buyer, 'It was otherwise: say what happened')
  await press(buyer, 'Send to a moderator')
  await buyer.getByText('Say in a sentence what happened.').waitFor()
  await buyer
    .getByRole('dialog')
    .getByRole('textbox', { name: 'What happened' })
    .fill('I was there at half past nine; nobody opened.')
  await press(buyer, 'Send to a moderator')
  await buyer.getByRole('dialog').waitFor({ state: 'hidden' })
  await expectNoAxeViolations(buyer)
  await keepShot(buyer, 'no-show-contested')
})

it('a buyer stands at the gate and says that the seller is not there', async () => {
  const order = await demoOrder({ state: 'ready', isBalancePaid: false })
  await moveSlot(order.orderId, -0.5, clockOffsetMs)
  const page = await openOrder(order, order.buyerEmail)
  await sayNoShow(page, 'The seller is not here')
  await page.getByText('The buyer says the seller was not there').waitFor()
  await expectNoAxeViolations(page)
  await keepShot(page, 'seller-not-there')
})
