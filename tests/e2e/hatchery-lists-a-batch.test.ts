import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import {
  expectNoAxeViolations,
  keepShot,
  openBrowser,
  tabTo,
  type TestBrowser,
} from '@/tests/support/browser'
import { pressOn, typeDay, typeInto } from '@/tests/support/by-keyboard'
import { signInDemo } from '@/tests/support/demo-people'
import { waitForMail } from '@/tests/support/mailbox'
import { confirmAddress, field, fillSignUp } from '@/tests/support/new-member'
import { plainPhoto } from '@/tests/support/pictures'

const { origin, mailOrigin, payOrigin, dataDir } = inject('wholeProduct')
const DAY_MS = 86_400_000
const dayAgo = (days: number) => new Date(Date.now() - days * DAY_MS).toISOString().slice(0, 10)
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

const isPhone = (page: Page) => (page.viewportSize()?.width ?? 0) < 700
const button = (page: Page, name: string | RegExp) =>
  page.getByRole('button', { name, exact: true }).filter({ visible: true })

async function join(page: Page, email: string): Promise<void> {
  await page.goto('/sell')
  await page.getByRole('link', { name: 'Start selling' }).waitFor()
  await expectNoAxeViolations(page)
  await page.goto('/sign-up')
  await fillSignUp(page, { name: 'Wren Millrace', email })
  await button(page, 'Make my account').click()
  await confirmAddress(page, mailOrigin, email)
}

async function openFarm(page: Page, farmName: string): Promise<void> {
  await page.goto('/sell')
  await page.getByRole('link', { name: 'Start selling' }).click()
  await field(page, 'Name').fill(farmName)
  await page.getByRole('radio', { name: /^Hatchery/ }).click()
  await field(page, 'Street and number').fill('12 Millrace Lane')
  await field(page, 'Town').fill('Dayton')
  await field(page, 'State').selectOption({ label: 'Ohio' })
  await field(page, 'ZIP').fill('45402')
  await field(page, 'Phone').fill('(937) 555-0188')
  // The licence is left out at first: the form says so, and nothing typed is lost.
  await button(page, 'Go on to payouts').click()
  await page.getByRole('heading', { name: 'One thing needs another look' }).waitFor()
  await expectNoAxeViolations(page)
  await page.getByRole('radio', { name: /None is needed/ }).click()
  await button(page, 'Go on to payouts').click()
  await page.getByRole('heading', { name: 'Payouts', level: 1 }).waitFor()
}

async function setUpPayouts(page: Page): Promise<void> {
  await expectNoAxeViolations(page)
  await button(page, 'Set up payouts').click()
  await page.waitForURL((url) => url.origin === payOrigin)
  await expectNoAxeViolations(page)
  await page.getByRole('button', { name: 'Finish' }).click()
  await page.getByText('Payouts are ready').waitFor()
}

const parts: readonly ((page: Page) => Promise<void>)[] = [
  async function speciesAndSize(page) {
    await field(page, 'Species').fill('blueg')
    await page
      .getByRole('option', { name: /^Bluegill/ })
      .first()
      .click()
    await field(page, 'Shortest').fill('2 1/4 in')
    await field(page, 'Longest').fill('3')
    await field(page, 'Stage').selectOption({ label: 'Fingerling' })
    await field(page, 'Hatched on').fill(dayAgo(150))
  },
  async function countAndPrice(page) {
    await field(page, 'How many are there to sell?').fill('1,200')
    await page.getByRole('radio', { name: /^By hand/ }).click()
    await field(page, 'Each').fill('0.95')
    await button(page, 'Add a price for larger orders').click()
    await field(page, 'From').nth(1).fill('100')
    await field(page, 'Each').nth(1).fill('0.80')
  },
  async function waterAndHealth(page) {
    await field(page, 'Temperature').fill('74 F')
    await field(page, 'pH').fill('7.4')
    await field(page, 'General hardness').fill('180')
    await field(page, 'Carbonate hardness').fill('120')
    await field(page, 'Water from').selectOption({ label: 'Well' })
    await button(page, 'Today: Measured on').click()
    await button(page, 'None: Treatments in the last 30 days').click()
    await button(page, 'None: Last losses').click()
  },
  async function legal(page) {
    await page.getByRole('radio', { name: /^Hatched here/ }).click()
    await page.getByRole('radio', { name: 'No, all were raised' }).click()
    await page.getByRole('checkbox', { name: /it holds one species/ }).click()
  },
  async function pickup(page) {
    await button(page, 'Add a pickup window').click()
    await page.getByRole('group', { name: 'Pickup window 1' }).waitFor()
  },
  async function shipping(page) {
    await page.getByRole('checkbox', { name: /can be shipped/ }).click()
    await field(page, 'Packed in').selectOption({ label: 'Foam box with 1 1/2 in walls, overnight' })
    await field(page, 'Charge for a box').fill('12')
    await field(page, 'Most fish in a box').fill('100')
    await field(page, 'Carrier and service').fill('Overnight by air')
    await field(page, 'Freight for a box').fill('38')
    await page.getByRole('checkbox', { name: /accepts these animals/ }).click()
    await button(page, 'Monday').click()
  },
  async function depositAndPromise(page) {
    await field(page, 'Deposit').fill('30')
  },
  async function photos(page) {
    const [chooser] = await Promise.all([
      page.waitForEvent('filechooser'),
      button(page, 'Add photos').click(),
    ])
    const buffer = await plainPhoto({ width: 1200, height: 900 })
    await chooser.setFiles({ name: 'pan.jpg', mimeType: 'image/jpeg', buffer })
    await page.getByRole('checkbox', { name: 'A ruler lies beside the fish' }).click()
  },
]

/** One group of questions a step on the phone; all of them on one page where there is room. */
async function fillBatch(page: Page, shot: string): Promise<void> {
  for (const [at, fillPart] of parts.entries()) {
    if (isPhone(page)) await expectNoAxeViolations(page)
    await fillPart(page)
    if (!isPhone(page)) continue
    await keepShot(page, `${shot}-step-${at + 1}`)
    await button(page, 'Next').click()
  }
  await page.getByRole('group', { name: 'How buyers will see it' }).getByText('2¼–3 in').waitFor()
}

async function publish(page: Page, shot: string): Promise<string> {
  await page
    .getByText(/^Saved/)
    .filter({ visible: true })
    .first()
    .waitFor()
  await expectNoAxeViolations(page)
  await keepShot(page, `${shot}-check`)
  await button(page, 'Publish this batch').click()
  await page.getByRole('heading', { name: 'Your batch is sent' }).waitFor()
  await expectNoAxeViolations(page)
  await keepShot(page, `${shot}-sent`)
  return /listings\/([^/]+)/.exec(page.url())?.[1] ?? ''
}

async function approve(farmName: string, isDark: boolean): Promise<void> {
  const desk = await browser.openPage({ width: 1280, origin, theme: isDark ? 'dark' : 'light' })
  await signInDemo(desk, { dataDir, role: 'admin' })
  await desk.goto('/moderate')
  await desk
    .getByRole('row', { name: new RegExp(farmName) })
    .getByRole('link')
    .click()
  await desk.getByRole('button', { name: /^Approve/ }).click()
  await desk.getByRole('button', { name: 'Approve it' }).click()
  await desk
    .getByText(/^Approved/)
    .first()
    .waitFor()
  await desk.context().close()
}

async function expectOnSale(listingId: string, farmName: string): Promise<void> {
  const visitor = await browser.openPage({ width: 390, origin })
  await visitor.goto(`/listings/${listingId}`)
  await visitor.getByRole('heading', { name: 'Bluegill fingerlings', level: 1 }).waitFor()
  await visitor.getByText(farmName).first().waitFor()
  expect(await visitor.locator('body').innerText()).not.toContain('12 Millrace Lane')
  await visitor.context().close()
}

describe.each([390, 1280])('a small hatchery at %i px', (width) => {
  it('opens a farm, sets up payouts, lists a batch and sees it go live', async () => {
    const stamp = `${width}-${Date.now()}`
    const email = `wren-${stamp}@example.org`
    const farmName = `Wren Pond ${stamp}`
    const page = await browser.openPage({ width, origin, theme: width === 390 ? 'dark' : 'light' })
    await join(page, email)
    await openFarm(page, farmName)
    await setUpPayouts(page)
    await page.getByRole('link', { name: 'List something' }).click()
    await page.getByRole('link', { name: 'Fish: list a batch' }).click()
    await button(page, 'Begin with an empty form').click()
    await field(page, 'Species').waitFor()
    await fillBatch(page, `batch-${width}`)
    const listingId = await publish(page, `batch-${width}`)

    await approve(farmName, width === 390)
    await waitForMail(mailOrigin, { to: email, subject: /live|on sale/i })
    await expectOnSale(listingId, farmName)
    await page.goto('/sell')
    await page
      .getByRole('link', { name: /^Bluegill fingerlings/ })
      .first()
      .waitFor()
    await expectNoAxeViolations(page)
    await keepShot(page, `sell-${width}`)
  })
})

describe('with the keyboard alone', () => {
  async function openFarmByKeyboard(page: Page, farmName: string): Promise<void> {
    await pressOn(page, 'Start selling')
    await typeInto(page, 'Name', farmName)
    await pressOn(page, /^Hatchery/, 'Space')
    await typeInto(page, 'Street and number', '12 Millrace Lane')
    await typeInto(page, 'Town', 'Dayton')
    await tabTo(page, 'State')
    await page.keyboard.type('Ohio')
    await typeInto(page, 'ZIP', '45402')
    await typeInto(page, 'Phone', '(937) 555-0188')
    await tabTo(page, /^I have a licence/)
    await page.keyboard.press('ArrowDown')
    await pressOn(page, 'Go on to payouts')
    await page.getByRole('heading', { name: 'Payouts', level: 1 }).waitFor()
    await pressOn(page, 'Set up payouts')
    await page.waitForURL((url) => url.origin === payOrigin)
    await pressOn(page, 'Finish')
    await page.getByText('Payouts are ready').waitFor()
  }

  async function fillByKeyboard(page: Page): Promise<void> {
    await typeInto(page, 'Species', 'blueg')
    await page
      .getByRole('option', { name: /^Bluegill/ })
      .first()
      .waitFor()
    await page.keyboard.press('ArrowDown')
    await page.keyboard.press('Enter')
    await typeInto(page, 'Shortest', '2 1/4 in')
    await typeInto(page, 'Longest', '3')
    await tabTo(page, 'Stage')
    await page.keyboard.type('Fingerling')
    await typeDay(page, /^Hatched on/, dayAgo(150))
    await typeInto(page, 'How many are there to sell?', '1,200')
    await pressOn(page, /^By hand/, 'Space')
    await typeInto(page, 'Each', '0.95')
    await typeInto(page, 'Temperature', '74 F')
    await typeInto(page, 'pH', '7.4')
    await typeInto(page, 'General hardness', '180')
    await typeInto(page, 'Carbonate hardness', '120')
    await tabTo(page, 'Water from')
    await page.keyboard.type('Well')
    await pressOn(page, 'Today: Measured on')
    await pressOn(page, 'None: Treatments in the last 30 days')
    await pressOn(page, 'None: Last losses')
    await pressOn(page, /^Hatched here/, 'Space')
    await pressOn(page, 'No, all were raised', 'Space')
    await pressOn(page, /it holds one species/, 'Space')
    await pressOn(page, 'Add a pickup window')
    const chooser = page.waitForEvent('filechooser')
    await pressOn(page, 'Add photos')
    const buffer = await plainPhoto({ width: 1200, height: 900 })
    await (await chooser).setFiles({ name: 'pan.jpg', mimeType: 'image/jpeg', buffer })
    await page.getByRole('group', { name: 'Photo 1' }).waitFor()
    await pressOn(page, 'A ruler lies beside the fish', 'Space')
  }

  it('a hatchery opens a farm and sends a batch', async () => {
    const stamp = Date.now()
    const page = await browser.openPage({ width: 1280, origin, theme: 'dark' })
    await join(page, `keys-${stamp}@example.org`)
    await page.goto('/sell')
    await page.getByRole('link', { name: 'Start selling' }).waitFor()
    await openFarmByKeyboard(page, `Key Pond ${stamp}`)
    await pressOn(page, 'List something')
    await page.getByRole('link', { name: 'Fish: list a batch' }).waitFor()
    await pressOn(page, 'Fish: list a batch')
    await page.getByRole('button', { name: 'Begin with an empty form' }).waitFor()
    await pressOn(page, 'Begin with an empty form')
    await field(page, 'Species').waitFor()
    await fillByKeyboard(page)
    await expectNoAxeViolations(page)
    await pressOn(page, 'Publish this batch')
    await page.getByRole('heading', { name: 'Your batch is sent' }).waitFor()
    await expectNoAxeViolations(page)
  })
})
