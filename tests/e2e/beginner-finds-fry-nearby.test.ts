import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import {
  expectNoAxeViolations,
  keepShot,
  nameOf,
  openBrowser,
  type TestBrowser,
} from '@/tests/support/browser'
import { pressOn, typeInto } from '@/tests/support/by-keyboard'
import { waitForMail } from '@/tests/support/mailbox'
import { confirmAddress, fillSignUp, NEW_PASSWORD } from '@/tests/support/new-member'

const { origin, mailOrigin, payOrigin } = inject('wholeProduct')
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

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
  await fillSignUp(page, { name: 'Robin Newpond', email })
  await expectNoAxeViolations(page)
  await page.getByRole('button', { name: 'Make my account' }).filter({ visible: true }).click()
  await confirmAddress(page, mailOrigin, email)
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
  const chooseFirst = async (page: Page) => {
    await page.keyboard.press('ArrowDown')
    await page.keyboard.press('Enter')
  }

  async function joinByKeyboard(page: Page, email: string): Promise<void> {
    await page.goto('/sign-up')
    await page.getByRole('button', { name: 'Make my account' }).waitFor()
    await expectNoAxeViolations(page)
    await typeInto(page, 'Your name', 'Robin Newpond')
    await typeInto(page, 'E-mail address', email)
    await typeInto(page, 'Password', NEW_PASSWORD)
    await page.keyboard.press('Enter')
    await confirmAddress(page, mailOrigin, email)
    await expectNoAxeViolations(page)
  }

  async function payByKeyboard(page: Page): Promise<void> {
    await page.waitForURL((url) => url.origin === payOrigin)
    await expectNoAxeViolations(page)
    await typeInto(page, 'Card number', '4242424242424242')
    await typeInto(page, /Expir/, '1234')
    await typeInto(page, /^CVC|Security/, '123')
    await typeInto(page, /Name/, 'Robin Newpond')
    await page.keyboard.press('Enter')
    await page.waitForURL((url) => url.origin === origin && url.pathname.startsWith('/orders/'))
  }

  it('a visitor finds a listing, joins, holds fish and pays', async () => {
    const email = `robin-keys-${Date.now()}@example.org`
    const page = await browser.openPage({ width: 1280, origin, theme: 'dark' })
    await page.goto('/')
    await typeInto(page, 'Where are you?', '45202')
    await page
      .getByRole('option', { name: /Cincinnati/ })
      .first()
      .waitFor()
    await chooseFirst(page)
    const tags = page.getByRole('list', { name: 'Listings' }).getByRole('link')
    await tags.first().waitFor()
    await expectNoAxeViolations(page)
    const address = await openBuyable(page)
    await expectNoAxeViolations(page)
    await joinByKeyboard(page, email)
    await page.goto(address)
    await page.getByRole('link', { name: /^Hold / }).waitFor()
    await pressOn(page, /^Hold /)
    await page.getByRole('heading', { name: 'What you pay' }).waitFor()
    const window = page.getByRole('radiogroup', { name: 'Pickup time' }).getByRole('radio')
    if (await window.count()) await pressOn(page, /(AM|PM) to /, 'Space')
    for (const box of await page.getByRole('checkbox').all()) await pressOn(page, await nameOf(box), 'Space')
    await expectNoAxeViolations(page)
    await pressOn(page, /^Hold \d/)
    await payByKeyboard(page)
    await page
      .getByText(/Day agreed|Waiting for the seller/)
      .first()
      .waitFor()
    await expectNoAxeViolations(page)
  })

  it('opens a listing from the results', async () => {
    const page = await browser.openPage({ width: 390, origin, theme: 'dark' })
    await page.goto('/')
    await typeInto(page, 'Where are you?', '45202')
    await page
      .getByRole('option', { name: /Cincinnati/ })
      .first()
      .waitFor()
    await chooseFirst(page)
    const tag = page.getByRole('list', { name: 'Listings' }).getByRole('link').first()
    await tag.waitFor()
    const title = await tag.getByRole('heading').innerText()
    await pressOn(page, new RegExp(title.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')))
    await page.waitForURL(/\/listings\//)
    await page.getByRole('heading', { level: 1 }).waitFor()
    await expectNoAxeViolations(page)
  })
})
