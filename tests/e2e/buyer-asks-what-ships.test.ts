import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'

const { origin } = inject('wholeProduct')
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

describe.each([390, 1280])('a buyer at %i px', (width) => {
  it('asks what can be shipped in May, sees it on the tags, as a year and as days on the listing, and is led on to order', async () => {
    const isPhone = width === 390
    const page = await browser.openPage({ width, origin, theme: isPhone ? 'dark' : 'light' })
    await page.goto('/?near=45202&withinKm=403')
    if (isPhone) await page.getByRole('button', { name: /^Filters and order/ }).click()
    await page.getByRole('checkbox', { name: /^Can be shipped to me/ }).click()
    await page.waitForURL(/shipWeek=\d+/)
    const weeks = page.getByLabel('Week of', { exact: true })
    const may = await weeks.evaluate((list) =>
      [...(list as HTMLSelectElement).options]
        .map(({ text }) => text)
        .find((text) => text.startsWith('May 1')),
    )
    await weeks.selectOption({ label: may ?? '' })
    await expectNoAxeViolations(page)
    await keepShot(page, `ships-${width}-filter`)
    if (isPhone)
      await page
        .getByRole('button', { name: /^Show / })
        .last()
        .click()
    await page.getByRole('button', { name: /Can be shipped, week of May 1/ }).waitFor()
    const tags = page.getByRole('list', { name: 'Listings' }).getByRole('listitem')
    await tags.filter({ hasText: 'in the week of May 1' }).first().waitFor()
    const texts = await tags.allInnerTexts()
    expect(texts.filter((text) => !/Ships to you in the week of May 1/.test(text))).toEqual([])
    await keepShot(page, `ships-${width}-found`)

    await tags.getByRole('link').first().click()
    const card = page.getByRole('region', { name: 'Shipping' })
    await card.getByRole('slider', { name: 'Week of the year' }).waitFor()
    await card.getByRole('heading', { name: 'The next ship days' }).waitFor()
    expect(await card.getByText(/shipped: \$[\d.]+ each at your end/).count()).toBe(1)
    await card.getByRole('link', { name: /^Have \d+ shipped$/ }).waitFor()
    await card.scrollIntoViewIfNeeded()
    await expectNoAxeViolations(page)
    await keepShot(page, `ships-${width}-listing`)
    await page.context().close()
  })
})
