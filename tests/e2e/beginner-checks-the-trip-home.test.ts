import { readFile } from 'node:fs/promises'

import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import {
  expectNoAxeViolations,
  keepShot,
  openBrowser,
  tabTo,
  type TestBrowser,
} from '@/tests/support/browser'
import { pressOn, typeInto } from '@/tests/support/by-keyboard'

const { origin } = inject('wholeProduct')
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

async function firstFish(): Promise<{ listingId: string; minOrder: number }> {
  const answer = await fetch(`${origin}/api/v1/listings?near=45202&within=100&species=bluegill&limit=1`)
  const { items } = (await answer.json()) as { items: { listingId: string; minOrder: number }[] }
  const [first] = items
  if (!first) throw new Error('no bluegill are on sale near Cincinnati')
  return first
}

const check = (page: Page) => page.getByRole('region', { name: 'The drive home' })

describe.each([390, 1280])('a beginner at %i px', (width) => {
  it('sees whether the fish survive the drive, and what changes it', async () => {
    const { listingId, minOrder } = await firstFish()
    const page = await browser.openPage({ width, origin, theme: width === 390 ? 'light' : 'dark' })
    await page.goto(`/listings/${listingId}?near=45202&count=${minOrder}`)
    await check(page).getByRole('button', { name: 'Check the drive' }).click()
    await check(page).getByText('They should arrive well').waitFor()
    await check(page)
      .getByRole('img', { name: /^On the (coldest|hottest) day of ten/ })
      .waitFor()
    await expectNoAxeViolations(page)

    // Two days in a pail without air: the oxygen is gone long before.
    await check(page).getByLabel('Hours on the way').fill('48')
    await check(page).getByText('Not like this').waitFor()
    await check(page).getByText('The water falls below the least oxygen this animal stands.').waitFor()
    await check(page).getByRole('button', { name: 'Show the figures' }).click()
    const table = check(page).getByRole('table', { name: 'The way, hour by hour' })
    expect(await table.getByRole('row').count()).toBeGreaterThan(5)
    await expectNoAxeViolations(page)
    await keepShot(page, `drive-${width}`)

    await check(page).getByLabel('Hours on the way').fill('a while')
    await check(page).getByText('A figure, like 0.75.').waitFor()
  })
})

it('a calculator answers with the keyboard alone, and says where from', async () => {
  const page = await browser.openPage({ width: 390, origin })
  await page.goto('/tools')
  await page.getByRole('list', { name: 'Calculators' }).waitFor()
  await expectNoAxeViolations(page)
  await pressOn(page, /^Ammonia: how much of it harms/)
  await page.getByText('Share of the total').waitFor()
  await tabTo(page, 'No')
  await page.keyboard.press('ArrowDown')
  await page.getByLabel('pH').fill('8.0')
  await page.getByText('5.37 %').waitFor()
  await page.getByText(/Emerson/).waitFor()
  await expectNoAxeViolations(page)
})

it('the season of a parcel is read week by week with the keyboard', async () => {
  const page = await browser.openPage({ width: 390, origin, theme: 'dark' })
  await page.goto('/tools/season')
  for (const [label, zip, town] of [
    ['Shipped from', '45202', /Cincinnati/],
    ['Shipped to', '40202', /Louisville/],
  ] as const) {
    await typeInto(page, label, zip)
    await page.getByRole('option', { name: town }).first().waitFor()
    await page.keyboard.press('ArrowDown')
    await page.keyboard.press('Enter')
  }
  const strip = page.getByRole('slider', { name: 'Week of the year' })
  await strip.waitFor()
  await expectNoAxeViolations(page)
  await keepShot(page, 'season-390')
  await tabTo(page, 'Week of the year')
  await page.keyboard.press('Home')
  expect(await strip.getAttribute('aria-valuetext')).toMatch(/^Week of (Dec|Jan) \d+: too cold$/)
  await page.keyboard.press('End')
  expect(await strip.getAttribute('aria-valuenow')).toBe('52')
  await pressOn(page, 'Show all weeks as a table')
  expect(await page.getByRole('table', { name: 'All weeks of the year' }).getByRole('row').count()).toBe(53)
  await expectNoAxeViolations(page)
})

it('a parcel gets a packing that is safe, and a sheet to print', async () => {
  const page = await browser.openPage({ width: 390, origin })
  await page.goto('/tools/parcel')
  await page.getByText('They should arrive well').waitFor()
  await expectNoAxeViolations(page)
  const download = page.waitForEvent('download')
  await page.getByRole('button', { name: 'Packing sheet to print (PDF)' }).click()
  const file = await (await download).path()
  expect((await readFile(file)).subarray(0, 5).toString()).toBe('%PDF-')
  // A hard frost: no packing of the list is safe, and the page says why.
  await page.getByLabel('Coldest air on the way').fill('-40')
  await page.getByText('Not like this').waitFor()
  await expectNoAxeViolations(page)
})
