import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import { connect, disconnect } from '@/db/client'
import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { printDate } from '@/shared/domain/calendar/print-date'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printCents } from '@/shared/units/money'
import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { twoBoxesToCome, type DemoBox } from '@/tests/support/demo-boxes'
import { signInNeighbour } from '@/tests/support/demo-people'
import { fingers } from '@/tests/support/hands'
import { fileIn, linkIn, waitForMail } from '@/tests/support/mailbox'

const { origin, mailOrigin, weatherOrigin, dataDir, databaseUrl, clockOffsetMs } = inject('wholeProduct')
let browser: TestBrowser
beforeAll(async () => {
  connect(databaseUrl)
  browser = await openBrowser()
})
afterAll(async () => {
  await browser.close()
  await disconnect()
})

/** Frost about the farm alone, on the ship day and the two days after it; what takes it off again. */
async function setFrost(page: Page, { fromLat, fromLng, shipDay }: DemoBox): Promise<() => Promise<void>> {
  await page.goto(weatherOrigin)
  await page.getByLabel('Only around this point:').check()
  await page.getByLabel('Latitude').fill(String(fromLat))
  await page.getByLabel('Longitude').fill(String(fromLng))
  await page.getByLabel('Miles around').fill('6')
  await page.getByLabel('First day').fill(shipDay)
  await page.getByLabel('Last day').fill(dateAfter(shipDay, 2))
  await page.getByLabel('Low, about 6 am').fill('-20')
  await page.getByLabel('High, about 3 pm').fill('-5')
  await page.getByRole('button', { name: 'Set this weather' }).click()
  const name = new RegExp(`^Remove: Within 6 miles of ${fromLat}, ${fromLng}, `)
  await page.getByRole('button', { name }).waitFor()
  await expectNoAxeViolations(page)
  return async () => {
    await page.goto(weatherOrigin)
    await page.getByRole('button', { name }).click()
    await page.getByRole('button', { name }).waitFor({ state: 'detached' })
  }
}

/** Both boxes of the day are looked at and held, as the animals would not arrive well. */
async function holdTheDay(page: Page, { shipDay }: DemoBox): Promise<void> {
  await page.goto('/orders/routes')
  const day = page.getByRole('region', { name: `Leaves ${printDate(shipDay)}` })
  await day.getByRole('button', { name: /^Look again and hold what is not safe/ }).click()
  await page.getByRole('dialog').getByText('the buyer is told at once').waitFor()
  await expectNoAxeViolations(page)
  await page.getByRole('button', { name: 'Look again and hold them' }).click()
  await page.getByText('Looked at 2 ways; 2 held, and the buyers told.').waitFor()
  await day.getByText('On hold for weather').nth(1).waitFor()
  expect(await day.getByText('Not safe to ship').count()).toBe(2)
  await expectNoAxeViolations(page)
}

async function openHeld(page: Page, box: DemoBox, since: Date): Promise<string> {
  const mail = await waitForMail(mailOrigin, { to: box.buyerEmail, subject: 'Held for weather', since })
  expect(mail.text).toContain(`The route is too cold on ${printDate(box.shipDay)}`)
  expect(mail.text).toMatch(/If you say nothing until .+, the new day counts/)
  const day = /Proposed instead:?\s+(\w{3}, \w{3} \d+)/.exec(mail.text)?.[1]
  if (!day) throw new Error(`no day is proposed in: ${mail.text}`)
  expect(day).not.toBe(printDate(box.shipDay))
  await page.goto(linkIn(mail, new RegExp(`/orders/${box.orderId}`)))
  await page.getByText('On hold for weather').first().waitFor()
  await page.getByText(`Proposed: to leave on ${day}.`).waitFor()
  await page.getByText(/^If you say nothing until .+, the new day stands\.$/).waitFor()
  await expectNoAxeViolations(page)
  return day
}

interface Told {
  to: string
  /** The day it leaves, in words. */
  leaves: string
  /** The day of the party's own calendar: a seller sends, a buyer receives. */
  day: string
  since: Date
}

/** The mail to a party after the new day was agreed on: it carries a file for their calendar. */
async function expectCalendar({ to, leaves, day, since }: Told): Promise<void> {
  const mail = await waitForMail(mailOrigin, { to, subject: `New day: leaves ${leaves}`, since })
  const bytes = await fileIn(mailOrigin, mail, 'box.ics')
  expect(calendarFaults(bytes)).toEqual([])
  const file = new TextDecoder().decode(bytes)
  const [, year = '', month = '', date = ''] = /DTSTART[^:]*:(\d{4})(\d\d)(\d\d)/.exec(file) ?? []
  expect(`${year}-${month}-${date}`).toBe(day)
  expect(file).toMatch(/SEQUENCE:[1-9]/)
}

interface Agreeing {
  buyer: Page
  seller: Page
  box: DemoBox
}

async function agree({ buyer, seller, box }: Agreeing, since: Date): Promise<void> {
  const leaves = await openHeld(buyer, box, since)
  await fingers(buyer).press('Agree to the new day')
  await buyer.getByText('Day agreed', { exact: true }).first().waitFor()
  await seller.goto(`/orders/${box.orderId}`)
  for (const page of [buyer, seller]) {
    await page.getByText(`${leaves}, 1 box`).waitFor()
    await expectNoAxeViolations(page)
  }
  const answer = await buyer.request.get(`/api/v1/orders/${box.orderId}`)
  const { shipment } = (await answer.json()) as ShownOrder
  if (!shipment) throw new Error('the order has lost its shipment')
  expect(printDate(shipment.shipDay)).toBe(leaves)
  await expectCalendar({ to: box.sellerEmail, leaves, day: shipment.shipDay, since })
  await expectCalendar({ to: box.buyerEmail, leaves, day: shipment.arriveDay, since })
}

async function takeTheMoney(page: Page, box: DemoBox, since: Date): Promise<void> {
  await openHeld(page, box, since)
  await fingers(page).press('End it for a full refund')
  await page.getByRole('dialog').getByText('Every cent you paid goes back.').waitFor()
  await expectNoAxeViolations(page)
  await fingers(page).press('End it, refund everything')
  await page.getByText('Ended', { exact: true }).first().waitFor()
  const strip = page.getByRole('complementary', { name: 'Money' }).or(page.getByRole('main'))
  await strip.getByText('Refunded', { exact: true }).first().waitFor({ timeout: 20_000 })
  expect(await strip.getByText(printCents(box.totalCents), { exact: true }).count()).toBeGreaterThan(1)
  await expectNoAxeViolations(page)
}

const themeOf = (width: number) => (width === 390 ? 'light' : 'dark')

/** Each page is met in the one look on the phone and in the other on the desk. */
async function somebody(email: string, width: number): Promise<Page> {
  const page = await browser.openPage({ width, origin, theme: themeOf(width) })
  await signInNeighbour(page, { dataDir, email })
  return page
}

describe.each([390, 1280])('a cold snap, seen at %i px', (width) => {
  it('holds two boxes; one buyer agrees to the new day, the other takes the money back', async () => {
    const [one, other] = await twoBoxesToCome(clockOffsetMs)
    const since = new Date()
    const sky = await browser.openPage({ width, theme: themeOf(width) })
    const endFrost = await setFrost(sky, one)
    try {
      const seller = await somebody(one.sellerEmail, width)
      await holdTheDay(seller, one)
      await keepShot(seller, `cold-${width}-held`)
      const buyer = await somebody(one.buyerEmail, width)
      await agree({ buyer, seller, box: one }, since)
      await keepShot(buyer, `cold-${width}-agreed`)
      const second = await somebody(other.buyerEmail, width)
      await takeTheMoney(second, other, since)
      await keepShot(second, `cold-${width}-refunded`)
      for (const page of [seller, buyer, second]) await page.context().close()
    } finally {
      await endFrost()
      await sky.context().close()
    }
  })
})
