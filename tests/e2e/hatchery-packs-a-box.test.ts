import { readFile } from 'node:fs/promises'

import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import { connect, disconnect } from '@/db/client'
import { printDate, printDateOfYear } from '@/shared/domain/calendar/print-date'
import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { ageLooks, boxOfToday, type DemoBox } from '@/tests/support/demo-boxes'
import { signInNeighbour } from '@/tests/support/demo-people'
import { fingers, keyboard, type Hands } from '@/tests/support/hands'
import { linkIn, waitForMail } from '@/tests/support/mailbox'
import { pdfWords } from '@/tests/support/pdf-words'

const { origin, mailOrigin, dataDir, databaseUrl, clockOffsetMs } = inject('wholeProduct')
const TRACKING = '1Z 999 AA1 01'
const TICKS = [
  /^Packed as the sheet says/,
  /^A strong double-wall carton/,
  /Live animals/,
  /^No free or flat-rate postal box/,
  /^The carrier was told/,
]
let browser: TestBrowser
beforeAll(async () => {
  connect(databaseUrl)
  browser = await openBrowser()
})
afterAll(async () => {
  await browser.close()
  await disconnect()
})

interface Person {
  page: Page
  hands: Hands
}

/** By finger and in the dark on the phone, by keyboard and in the light on the desk: each page is met in both looks. */
async function somebody(email: string, width: number): Promise<Person> {
  const page = await browser.openPage({ width, origin, theme: width === 390 ? 'dark' : 'light' })
  await signInNeighbour(page, { dataDir, email })
  return { page, hands: width === 390 ? fingers(page) : keyboard(page) }
}

async function lookAgain({ page, hands }: Person): Promise<void> {
  const looked = page.waitForResponse((answer) => answer.url().endsWith('/route-check'))
  await hands.press('Look at the way again')
  await looked
  await page.getByText(/^Looked at by the seller/).waitFor()
}

/** From the list of what leaves to the order, whose way is looked at once more. */
async function openFromRoutes(person: Person, { orderId, shipDay }: DemoBox): Promise<void> {
  const { page, hands } = person
  await page.goto('/orders/routes')
  await page.getByRole('heading', { name: `Leaves ${printDate(shipDay)}` }).waitFor()
  await expectNoAxeViolations(page)
  await hands.follow(`/orders/${orderId}`)
  await page.getByRole('heading', { name: 'Send the box' }).waitFor()
  await lookAgain(person)
  await expectNoAxeViolations(page)
}

async function printSheet({ page, hands }: Person, box: DemoBox): Promise<void> {
  const [file] = await Promise.all([
    page.waitForEvent('download'),
    hands.press('Packing sheet and labels (PDF)'),
  ])
  expect(file.suggestedFilename()).toBe('packing-and-labels.pdf')
  const pages = await pdfWords(await readFile(await file.path()))
  expect(pages[0]).toMatch(new RegExp(`Packing sheet: ${box.quantity} `))
  const label = pages.at(-1) ?? ''
  for (const words of ['LIVE ANIMALS', 'Box 1 of 1', box.buyerName, box.street, box.farmName])
    expect(label).toContain(words)
}

/** The first paper of the way, or one of their own where no rule asks for any, is good until a day. */
async function namePaper({ page, hands }: Person, goodUntil: string): Promise<void> {
  await hands.press(/^(Name the papers it needs|Papers for the way)$/)
  const sheet = page.getByRole('dialog', { name: 'Papers for the way' })
  await sheet.waitFor()
  if ((await sheet.getByLabel('Good until').count()) === 0) {
    await hands.press('Another paper')
    await hands.type('Which paper', 'Health certificate')
    await hands.type('Number', 'A 1142')
    await hands.type('Issued by', 'State veterinarian')
    await hands.typeDay('Issued on', '2026-01-04')
  }
  await hands.typeDay('Good until', goodUntil)
  await expectNoAxeViolations(page)
  await hands.press('Keep these papers')
  await sheet.waitFor({ state: 'detached' })
}

/** Nothing ticked: told by the form. All ticked, but the paper and the look are too old: told by the server, both at once. */
async function beRefused({ page, hands }: Person, { shipDay, arriveDay }: DemoBox): Promise<void> {
  await hands.press('It is on its way')
  const summary = page.getByRole('alert').filter({ hasText: 'need another look' })
  await summary.waitFor()
  expect(await summary.getByText(/^Not yet ticked: /).count()).toBe(TICKS.length)
  await expectNoAxeViolations(page)
  for (const tick of TICKS) await hands.tick(tick)
  await hands.type('Tracking number', TRACKING)
  await hands.press('It is on its way')
  await page.getByText('Not sent: the animals and the money stay').waitFor()
  const over = `expires on ${printDateOfYear(shipDay)}, before the box arrives on ${printDate(arriveDay)}.`
  await page.getByText(/^• /).filter({ hasText: over }).waitFor()
  await page.getByText(/^• The last look at the way is 1[34] hours old; it counts for 12/).waitFor()
  await expectNoAxeViolations(page)
}

async function sendBox(seller: Person, box: DemoBox): Promise<void> {
  const { page, hands } = seller
  await namePaper(seller, '2031-12-31')
  await lookAgain(seller)
  await hands.press('It is on its way')
  await page.getByText('The paper that travels with them').waitFor()
  await hands.press('Show all of it')
  await page.getByText(TRACKING).first().waitFor()
  expect(await page.getByText(new RegExp(box.street)).count()).toBeGreaterThan(0)
  await expectNoAxeViolations(page)
}

/** From the mail to the order: on its way, here, looked after, all well. */
async function receiveBox({ page, hands }: Person, box: DemoBox, since: Date): Promise<void> {
  const mail = await waitForMail(mailOrigin, { to: box.buyerEmail, subject: 'On their way', since })
  for (const words of [TRACKING, printDate(box.arriveDay)]) expect(mail.text).toContain(words)
  await page.goto(linkIn(mail, new RegExp(`/orders/${box.orderId}`)))
  await page.getByText('When the box comes', { exact: true }).waitFor()
  await page.getByText('On its way', { exact: true }).first().waitFor()
  await expectNoAxeViolations(page)
  await hands.press('The box is here')
  await page.getByText('Look after them now', { exact: true }).waitFor()
  await page.getByText(/^Open the box at once, in the shade/).waitFor()
  await page.getByText(/^The bag has been shut for about \d+ hours/).waitFor()
  await expectNoAxeViolations(page)
  await hands.press('All good: release the money')
  await page.getByRole('dialog').waitFor()
  await hands.press('All good, release it')
  await page.getByText('Complete', { exact: true }).first().waitFor()
  await page.getByText('Released to the seller').waitFor({ timeout: 20_000 })
  await expectNoAxeViolations(page)
}

describe.each([390, 1280])('a farm at %i px', (width) => {
  it('packs a box that leaves today, is refused once, sends it, and is paid when it has arrived well', async () => {
    const box = await boxOfToday(clockOffsetMs)
    const since = new Date()
    const seller = await somebody(box.sellerEmail, width)
    await openFromRoutes(seller, box)
    await printSheet(seller, box)
    await namePaper(seller, box.shipDay)
    await ageLooks(box.orderId, 13)
    await beRefused(seller, box)
    await keepShot(seller.page, `packs-${width}-refused`)
    await sendBox(seller, box)
    await keepShot(seller.page, `packs-${width}-sent`)
    const buyer = await somebody(box.buyerEmail, width)
    await receiveBox(buyer, box, since)
    await keepShot(buyer.page, `packs-${width}-settled`)
    for (const { page } of [seller, buyer]) await page.context().close()
  })
})
