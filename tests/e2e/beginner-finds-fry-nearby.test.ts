import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import {
  expectNoAxeViolations,
  keepShot,
  openBrowser,
  tabTo,
  type TestBrowser,
} from '@/tests/support/browser'
import { linkIn, waitForMail } from '@/tests/support/mailbox'

const { origin, mailOrigin, payOrigin } = inject('wholeProduct')
const PASSWORD = 'lantern gravel otter 9'
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

/** Pages behind the one in view stay mounted, hidden: only what is seen counts. */
const field = (page: Page, label: string | RegExp, isExact = false) =>
  page.getByLabel(label, { exact: isExact }).filter({ visible: true })

const isPhone = (page: Page) => (page.viewportSize()?.width ?? 0) < 700

async function sayWhere(page: Page): Promise<void> {
  await page.getByLabel('Where are you?').fill('45202')
  await page
    .getByRole('option', { name: /Cincinnati/ })
    .first()
    .click()
  await page
    .getByText(/near Cincinnati/i)
    .first()
    .waitFor()
}

async function askForTwenty(page: Page): Promise<void> {
  if (isPhone(page)) await page.getByRole('button', { name: /^Filters and order/ }).click()
  await page.getByLabel('How many do you want?').fill('50')
  await page.keyboard.press('Tab')
  if (isPhone(page))
    await page
      .getByRole('button', { name: /^(Show|See)/ })
      .last()
      .click()
  await page.waitForURL(/count=50/)
}

/** Opens results until one may be bought without a paper; answers its page. */
async function openBuyable(page: Page): Promise<string> {
  const tags = page.getByRole('list', { name: 'Listings' }).getByRole('link')
  await tags.first().waitFor()
  const addresses = await tags.evaluateAll((links) => links.map((link) => link.getAttribute('href') ?? ''))
  for (const address of addresses.filter((one) => one.includes('/listings/'))) {
    await page.goto(origin + address)
    await page.getByRole('heading', { level: 1 }).waitFor()
    const hold = page.getByRole('link', { name: /^Hold / })
    await Promise.race([hold.waitFor(), page.waitForTimeout(3000)])
    if (await hold.count()) return address
  }
  throw new Error('no listing in the results may be held')
}

async function makeAccount(page: Page, email: string): Promise<void> {
  await page.getByRole('link', { name: 'Sign in' }).filter({ visible: true }).last().click()
  await page.getByRole('link', { name: 'Make an account' }).click()
  await field(page, 'Your name').fill('Robin Newpond')
  await field(page, 'E-mail address').fill(email)
  await field(page, 'Password', true).fill(PASSWORD)
  await expectNoAxeViolations(page)
  await page.getByRole('button', { name: 'Make my account' }).filter({ visible: true }).click()
  const mail = await waitForMail(mailOrigin, { to: email, subject: 'Confirm your e-mail address' })
  await page.goto(linkIn(mail, /verify-email/))
  await page.waitForLoadState('networkidle')
}

async function fillReservation(page: Page): Promise<void> {
  await page.getByRole('heading', { name: 'What you pay' }).waitFor()
  const window = page.getByRole('radiogroup', { name: 'Pickup time' }).getByRole('radio')
  if (await window.count()) await window.first().click()
  for (const box of await page.getByRole('checkbox').all()) await box.click()
}

async function pay(page: Page): Promise<void> {
  await page.waitForURL((url) => url.origin === payOrigin)
  await expectNoAxeViolations(page)
  await page.getByLabel('Card number').fill('4242 4242 4242 4242')
  await page.getByLabel(/Expir/).fill('12/34')
  await page.getByLabel(/^CVC|Security/).fill('123')
  await page.getByLabel(/Name/).fill('Robin Newpond')
  await page.getByRole('button', { name: /^Pay/ }).click()
  await page.waitForURL((url) => url.origin === origin && url.pathname.startsWith('/orders/'))
}

describe.each([390, 1280])('a beginner at %i px', (width) => {
  it('finds fish nearby, makes an account on the way, holds them and pays the deposit', async () => {
    const email = `robin${width}-${Date.now()}@example.org`
    const page = await browser.openPage({ width, origin })
    await page.goto('/')
    await sayWhere(page)
    await askForTwenty(page)
    await expectNoAxeViolations(page)
    await keepShot(page, `find-${width}`)

    const address = await openBuyable(page)
    await expectNoAxeViolations(page)
    await keepShot(page, `listing-${width}`)
    await page.getByRole('link', { name: /^Hold / }).click()
    await page.getByRole('heading', { name: 'Sign in to hold animals' }).waitFor()
    await makeAccount(page, email)

    await page.goto(`${address.split('?')[0]}/reserve?near=45202`)
    await fillReservation(page)
    await expectNoAxeViolations(page)
    await keepShot(page, `reserve-${width}`)
    await page.getByRole('button', { name: /^Hold \d/ }).click()
    await pay(page)

    await page
      .getByText(/Day agreed|Waiting for the seller/)
      .first()
      .waitFor()
    await expectNoAxeViolations(page)
    await keepShot(page, `order-${width}`)
    const mail = await waitForMail(mailOrigin, { to: email, subject: /Pickup|Your request/ })
    expect(mail.text).toContain('$')
  })
})

describe('with the keyboard alone', () => {
  it('a visitor says where they are, opens a listing and reaches the hold', async () => {
    const page = await browser.openPage({ width: 1280, origin, theme: 'dark' })
    await page.goto('/')
    await tabTo(page, 'Where are you?')
    await page.keyboard.type('45202')
    await page
      .getByRole('option', { name: /Cincinnati/ })
      .first()
      .waitFor()
    await page.keyboard.press('ArrowDown')
    await page.keyboard.press('Enter')
    const tags = page.getByRole('list', { name: 'Listings' }).getByRole('link')
    await tags.first().waitFor()
    await expectNoAxeViolations(page)
    const name =
      (await tags.first().getAttribute('aria-label')) ?? (await tags.first().innerText()).split('\n')[0] ?? ''
    await tabTo(page, new RegExp(name.slice(0, 12).replace(/[.*+?^${}()|[\]\\]/g, '\\$&')))
    await page.keyboard.press('Enter')
    await page.waitForURL(/\/listings\//)
    await page.getByRole('heading', { level: 1 }).waitFor()
    await expectNoAxeViolations(page)
  })
})
