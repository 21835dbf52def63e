import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { signInDemo } from '@/tests/support/demo-people'

const { origin, mailOrigin, dataDir } = inject('wholeProduct')
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

interface Waiting {
  address: string
  title: string
}

const main = (page: Page) => page.locator('main').filter({ visible: true })

/** The listings that wait, in the order of the desk: rows of a table where there is room, tags on the phone. */
async function queue(page: Page): Promise<Waiting[]> {
  await page.goto('/moderate')
  const links = main(page).locator('a[href^="/moderate/listings/"]')
  await links.first().waitFor()
  return links.evaluateAll((all) =>
    all.map((link) => ({
      address: link.getAttribute('href') ?? '',
      title: link.querySelector('h2')?.textContent ?? link.textContent,
    })),
  )
}

async function open(page: Page, { address, title }: Waiting): Promise<void> {
  await page.goto(address)
  await page.getByRole('heading', { name: title, level: 1 }).waitFor()
}

const say = (page: Page, name: string | RegExp) => main(page).getByRole('button', { name })

async function approve(page: Page, one: Waiting): Promise<void> {
  await open(page, one)
  await say(page, /^Approve/).click()
  await page.getByRole('button', { name: 'Approve it' }).click()
  await page
    .getByText(/^Approved/)
    .first()
    .waitFor()
}

async function ask(page: Page, one: Waiting, words: string): Promise<void> {
  await open(page, one)
  await say(page, /^Ask/).click()
  // Without a reason and words nothing is sent, and the sheet says what is missing.
  await page.getByRole('button', { name: 'Send the question' }).click()
  await page.getByText('A reason goes with it.').waitFor()
  await expectNoAxeViolations(page)
  await page.getByRole('radio', { name: /No ruler to be seen/ }).click()
  await page.getByLabel('Words to the seller').fill(words)
  await page.getByRole('button', { name: 'Send the question' }).click()
  await page
    .getByText(/^Asked/)
    .first()
    .waitFor()
}

async function reject(page: Page, one: Waiting): Promise<void> {
  await open(page, one)
  await say(page, /^Reject/).click()
  await page.getByRole('radio', { name: /Species in doubt/ }).click()
  await page.getByRole('button', { name: 'Reject it' }).click()
  await page
    .getByText(/^Rejected/)
    .first()
    .waitFor()
}

/** Whether such a mail has gone out since; the catcher keeps all of them. */
async function isMailed(subject: string, since: Date): Promise<boolean> {
  const answer = await fetch(`${mailOrigin}/api/messages`)
  const mails = (await answer.json()) as { subject: string; receivedAt: string }[]
  return mails.some((mail) => mail.subject === subject && mail.receivedAt >= since.toISOString())
}

const expectMail = (subject: string, since: Date) =>
  expect.poll(() => isMailed(subject, since), { timeout: 10_000, message: subject }).toBe(true)

describe.each([390, 1280])('an admin at %i px', (width) => {
  it('reads the queue, asks, rejects and approves, and each seller is told', async () => {
    const page = await browser.openPage({ width, origin, theme: width === 390 ? 'light' : 'dark' })
    await signInDemo(page, { dataDir, role: 'admin' })
    const waiting = await queue(page)
    expect(waiting.length).toBeGreaterThan(3)
    await expectNoAxeViolations(page)
    await keepShot(page, `queue-${width}`)
    const [riskiest, second] = waiting as [Waiting, Waiting]
    const safest = waiting.at(-1) as Waiting
    await open(page, riskiest)
    await expectNoAxeViolations(page)
    await keepShot(page, `review-${width}`)

    const since = new Date()
    await reject(page, riskiest)
    await ask(page, second, `Please show the ruler beside the fish (${width}).`)
    await approve(page, safest)
    // Other journeys send listings meanwhile: these three are gone, and none that waited beside them.
    const left = (await queue(page)).map(({ address }) => address)
    const kept = waiting.slice(2, -1).map(({ address }) => address)
    for (const { address } of [riskiest, second, safest]) expect(left).not.toContain(address)
    expect(left).toEqual(expect.arrayContaining(kept.slice(0, 2)))
    await expectMail(`${riskiest.title} was not accepted`, since)
    await expectMail(`${second.title} needs an answer from you`, since)
    await expectMail(`${safest.title} is live`, since)
  })
})

describe('with the keyboard alone', () => {
  it('walks the queue and decides', async () => {
    const page = await browser.openPage({ width: 1280, origin, theme: 'light' })
    await signInDemo(page, { dataDir, role: 'moderator' })
    const [first] = (await queue(page)) as [Waiting]
    await page.keyboard.press('j')
    await page.keyboard.press('j')
    await page.keyboard.press('k')
    await page.keyboard.press('Enter')
    await page.waitForURL(new RegExp(`${first.address}$`))
    await page.getByRole('heading', { name: first.title, level: 1 }).filter({ visible: true }).waitFor()
    await page.keyboard.press('?')
    await page.getByRole('dialog').waitFor()
    await expectNoAxeViolations(page)
    await page.keyboard.press('Escape')
    await page.getByRole('dialog').waitFor({ state: 'hidden' })
    const since = new Date()
    await page.keyboard.press('r')
    await page.getByRole('dialog').waitFor()
    await page.keyboard.press('2')
    await page.keyboard.press('Control+Enter')
    await page
      .getByText(/^Rejected/)
      .first()
      .waitFor()
    await page.waitForURL(
      (url) => url.pathname.startsWith('/moderate/listings/') && url.pathname !== first.address,
    )
    await expectMail(`${first.title} was not accepted`, since)
  })
})
