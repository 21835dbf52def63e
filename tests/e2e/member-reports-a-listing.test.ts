import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import type { FoundListing } from '@/shared/contracts/search'
import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { signInDemo } from '@/tests/support/demo-people'

const { origin, mailOrigin, dataDir } = inject('wholeProduct')
const SAID = 'The photo shows green sunfish, not what the title says.'
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

const main = (page: Page) => page.locator('main').filter({ visible: true })

async function onSale(page: Page): Promise<FoundListing[]> {
  const answer = await page.request.get('/api/v1/listings?near=45202&withinKm=400&limit=50')
  return ((await answer.json()) as { items: FoundListing[] }).items
}

/** The one furthest away: journeys that run meanwhile buy what is near. */
async function farAway(page: Page): Promise<FoundListing> {
  const listing = (await onSale(page)).at(-1)
  if (!listing) throw new Error('nothing is on sale around Cincinnati')
  return listing
}

/** A page by its address, once its heading stands there. */
async function open(page: Page, listing: FoundListing): Promise<void> {
  await page.goto(`/listings/${listing.listingId}`)
  await main(page).getByRole('heading', { name: listing.title }).first().waitFor()
}

async function sendReport(page: Page): Promise<void> {
  await main(page).getByRole('button', { name: 'Report this listing' }).click()
  const sheet = page.getByRole('dialog')
  await sheet.waitFor()
  await sheet.getByRole('radio', { name: 'Something else' }).click()
  await sheet.getByRole('button', { name: 'Send the report' }).click()
  await sheet.getByText('Say in a sentence or two what is wrong.').waitFor()
  await expectNoAxeViolations(page)
  await keepShot(page, `report-sheet-${page.viewportSize()?.width}`)
  await sheet.getByLabel('In your words').fill(SAID)
  await sheet.getByRole('radio', { name: 'It is not what it says' }).click()
  await sheet.getByRole('button', { name: 'Send the report' }).click()
  await main(page).getByText('Thank you: you have reported this').waitFor()
}

async function takeOffSale(page: Page, listing: FoundListing, note: string): Promise<void> {
  await page.goto('/moderate')
  const row = main(page)
    .getByRole('list', { name: 'Reported listings' })
    .getByRole('listitem')
    .filter({ hasText: SAID })
  await row.getByText('1 member reports it').waitFor()
  await expectNoAxeViolations(page)
  await row.scrollIntoViewIfNeeded()
  await keepShot(page, 'reported-390')
  await row.getByRole('button', { name: 'Take off sale' }).click()
  const sheet = page.getByRole('dialog')
  await sheet.getByText(/No order is open from it|not touched/).waitFor()
  await sheet.getByRole('button', { name: 'Take it off sale' }).click()
  await sheet.getByText('A reason goes with it.').waitFor()
  await expectNoAxeViolations(page)
  await keepShot(page, 'take-down-390')
  await sheet.getByRole('radio', { name: /Not what the listing says/ }).click()
  await sheet.getByLabel('Words to the seller').fill(note)
  await sheet.getByRole('button', { name: 'Take it off sale' }).click()
  await page.getByText(`Off sale: ${listing.title}`).first().waitFor()
  await row.waitFor({ state: 'detached' })
}

async function isMailed(subject: string, since: Date): Promise<boolean> {
  const answer = await fetch(`${mailOrigin}/api/messages`)
  const mails = (await answer.json()) as { subject: string; receivedAt: string }[]
  return mails.some((mail) => mail.subject === subject && mail.receivedAt >= since.toISOString())
}

describe('a member at 390 px', () => {
  it('reports a listing, a moderator takes it off sale, and it is nowhere any more', async () => {
    const page = await browser.openPage({ width: 390, origin })
    const listing = await farAway(page)
    await open(page, listing)
    // A visitor is led to sign in, and back.
    await main(page).getByRole('link', { name: 'Report this listing: sign in first' }).click()
    await page.waitForURL(/\/sign-in\?returnTo=/)
    expect(new URL(page.url()).searchParams.get('returnTo')).toBe(`/listings/${listing.listingId}`)
    await signInDemo(page, { dataDir, role: 'beginner' })
    await open(page, listing)
    await sendReport(page)
    await expectNoAxeViolations(page)
    await page.context().close()

    const since = new Date()
    const desk = await browser.openPage({ width: 390, origin })
    await signInDemo(desk, { dataDir, role: 'moderator' })
    await takeOffSale(desk, listing, 'Please list it anew under its right name.')
    await expect
      .poll(() => isMailed(`${listing.title} was taken off sale`, since), { timeout: 10_000 })
      .toBe(true)

    const visitor = await browser.openPage({ width: 390, origin })
    await visitor.goto(`/listings/${listing.listingId}`)
    await visitor
      .getByRole('heading', { name: /not here|gone|No .* at this address/i })
      .first()
      .waitFor()
    const answer = await visitor.request.get(`/api/v1/listings/${listing.listingId}`)
    expect(answer.status()).toBe(404)
    expect((await onSale(visitor)).map((one) => one.listingId)).not.toContain(listing.listingId)
  })
})

describe('with the keyboard alone', () => {
  it('a moderator steps to a reported listing and closes its reports', async () => {
    const page = await browser.openPage({ width: 1280, origin, theme: 'dark' })
    await signInDemo(page, { dataDir, role: 'beginner' })
    const listing = await farAway(page)
    await open(page, listing)
    await sendReport(page)
    await page.context().close()

    const desk = await browser.openPage({ width: 1280, origin, theme: 'dark' })
    await signInDemo(desk, { dataDir, role: 'moderator' })
    await desk.goto('/moderate')
    const table = main(desk).getByRole('table', { name: 'Reported listings' })
    await table.getByText(SAID).waitFor()
    await expectNoAxeViolations(desk)
    await table.scrollIntoViewIfNeeded()
    await keepShot(desk, 'reported-1280')
    const link = table.getByRole('link', { name: listing.title })
    const isThere = () => link.evaluate((element) => element === document.activeElement)
    for (let steps = 0; steps < 60 && !(await isThere()); steps++) await desk.keyboard.press('j')
    expect(await isThere()).toBe(true)
    await desk.keyboard.press('w')
    await desk.getByRole('dialog', { name: `Nothing wrong: ${listing.title}` }).waitFor()
    // The desk's own keys rest while the sheet is open.
    await desk.keyboard.press('t')
    await expectNoAxeViolations(desk)
    await desk.keyboard.press('Control+Enter')
    await desk.getByText(`Closed: ${listing.title}`).first().waitFor()
    await main(desk).getByText('Nothing is reported').waitFor()
    await open(desk, listing)
  })
})

describe('a reader at 390 px', () => {
  it('holds their water against the grower’s, and sees what else the farm sells', async () => {
    const page = await browser.openPage({ width: 390, origin })
    const all = await onSale(page)
    const listing = all.find((one) => all.filter(({ farmName }) => farmName === one.farmName).length > 1)
    if (!listing) throw new Error('no farm has two listings')
    await open(page, listing)
    const field = (name: RegExp) => main(page).getByLabel(name)
    await field(/^Your temperature/).fill('50 F')
    await field(/^Your pH/).fill('seven')
    await field(/^Your carbonate hardness/).fill('2 dKH')
    await main(page).getByText('A pH, such as 7.2.').waitFor()
    const rows = main(page).getByRole('list', { name: 'Theirs and yours' }).getByRole('listitem')
    await expect.poll(() => rows.count()).toBe(2)
    await rows.filter({ hasText: '50 °F (10 °C)' }).waitFor()
    await rows.filter({ hasText: 'Yours is too soft' }).waitFor()
    await field(/^Your pH/).fill('7.2')
    await expect.poll(() => rows.count()).toBe(3)
    await rows.first().scrollIntoViewIfNeeded()
    await keepShot(page, 'your-water-390')
    await expectNoAxeViolations(page)
    // Kept on the device alone: it is there again after a reload.
    await page.reload()
    await expect.poll(() => rows.count()).toBe(3)
    expect(await field(/^Your temperature/).inputValue()).toBe('50 °F')

    await main(page)
      .getByRole('link', { name: /more from this farm/ })
      .click()
    await page.waitForURL(/\/sellers\//)
    const tags = main(page).getByRole('list', { name: 'On sale now' }).getByRole('listitem')
    await expect.poll(() => tags.count()).toBeGreaterThan(1)
    await keepShot(page, 'on-sale-now-390')
    await expectNoAxeViolations(page)
    await page.goto(`/listings/${listing.listingId}`)
    await main(page).getByRole('button', { name: 'Forget my figures' }).click()
    await rows.first().waitFor({ state: 'detached' })
    expect(await field(/^Your temperature/).inputValue()).toBe('')
  })
})
