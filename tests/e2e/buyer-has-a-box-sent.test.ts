import { sql } from 'drizzle-orm'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, inject, it } from 'vitest'

import { connect, db, disconnect } from '@/db/client'
import type { ShownListing } from '@/shared/contracts/listings'
import type { ShipDayOffers } from '@/shared/contracts/shipments'
import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { signInDemo, signInNeighbour } from '@/tests/support/demo-people'

const { origin, dataDir, databaseUrl, payOrigin } = inject('wholeProduct')
const CINCINNATI = '45202'
let browser: TestBrowser
beforeAll(async () => {
  connect(databaseUrl)
  browser = await openBrowser()
})
afterAll(async () => {
  await browser.close()
  await disconnect()
})

interface Shipped {
  listingId: string
  sellerEmail: string
}

/** A batch of one of the demo's other farms that may be held, and leaves on at least two safe days. */
async function shippedBatch(page: Page): Promise<Shipped> {
  const [rows] = (await db().execute(sql`
    SELECT l.public_id AS listingId, u.email AS sellerEmail
    FROM listing l JOIN seller s ON s.id = l.seller_id JOIN user u ON u.id = s.member_id
      JOIN listing_search q ON q.listing_id = l.id
    WHERE l.state = 'live' AND q.lane > 0 AND u.email LIKE '%@farms.example' ORDER BY l.id`)) as unknown as [
    Shipped[],
  ]
  for (const row of rows) {
    const read = async <T>(path: string) => (await (await page.request.get(path)).json()) as T
    const at = `/api/v1/listings/${row.listingId}`
    const { shipped, may, body, gate } = await read<ShownListing>(`${at}?near=${CINCINNATI}`)
    if (!shipped?.isServed || !may.includes('reserve') || gate?.buy !== 'ticks') continue
    const asked = `near=${CINCINNATI}&quantity=${body.minOrder}`
    const { days } = await read<ShipDayOffers>(`${at}/ship-days?${asked}`)
    if (days.filter(({ verdict }) => verdict === 'safe').length > 1) return row
  }
  throw new Error('no batch of the demo is shipped on two safe days')
}

async function pay(page: Page): Promise<void> {
  await page.waitForURL((url) => url.origin === payOrigin)
  await page.getByLabel('Card number').fill('4242 4242 4242 4242')
  await page.getByLabel(/Expir/).fill('12/34')
  await page.getByLabel(/^CVC|Security/).fill('123')
  await page.getByLabel(/Name/).fill('June Park')
  await page.locator('button').first().click()
  await page.waitForURL((url) => url.origin === origin && url.pathname.startsWith('/orders/'))
}

async function fillAddress(page: Page): Promise<void> {
  await page.getByRole('heading', { name: 'Where does the box go?' }).waitFor()
  await page.getByLabel('Name').fill('June Park')
  await page.getByLabel('Street and number').fill('1 Mill Road')
  await page.getByLabel('Town').fill('Cincinnati')
  await page.getByLabel('State', { exact: true }).selectOption('OH')
  await page.getByLabel('ZIP').fill(CINCINNATI)
  await page.getByLabel('Phone').fill('(513) 555-0100')
  await page
    .getByRole('radio', { name: /Safe to ship/ })
    .first()
    .click()
  for (const box of await page.getByRole('checkbox').all()) await box.click()
}

const press = (page: Page, name: string | RegExp) =>
  page.getByRole('button', { name }).filter({ visible: true }).last().click()

it('a buyer has a box sent, pays the deposit, and the seller has it on the list of its day', async () => {
  const buyer = await browser.openPage({ width: 390, origin })
  await signInDemo(buyer, { dataDir, role: 'beginner' })
  const batch = await shippedBatch(buyer)
  await buyer.goto(`/listings/${batch.listingId}`)
  const place = { near: CINCINNATI, cell: CINCINNATI, label: `Cincinnati, OH ${CINCINNATI}`, state: 'OH' }
  await buyer.evaluate((kept) => localStorage.setItem('place', kept), JSON.stringify(place))
  await buyer.goto(`/listings/${batch.listingId}/reserve?way=ship`)
  await fillAddress(buyer)
  await keepShot(buyer, 'box-reserved')
  await expectNoAxeViolations(buyer)
  await press(buyer, /^Hold \d+ and pay/)
  await pay(buyer)
  await buyer.getByText('Held at the carrier’s counter, to be collected').waitFor()
  const order = new URL(buyer.url()).pathname

  const seller = await browser.openPage({ width: 1280, origin })
  await signInNeighbour(seller, { dataDir, email: batch.sellerEmail })
  await seller.goto(order)
  const accept = seller.getByRole('button', { name: /^Accept: sell/ })
  const look = seller.getByRole('button', { name: 'Look at the way again' })
  await accept.or(look).first().waitFor()
  if (await accept.count()) await accept.click()
  await look.click()
  await seller.getByText(/^Looked at by the seller/).waitFor()
  const way = await seller
    .getByText(/^Leaves .+, arrives /)
    .first()
    .innerText()
  await seller.goto('/orders/routes')
  const leaves = seller.getByRole('region', { name: way.split(', arrives')[0] })
  await leaves.getByRole('table').getByText('Cincinnati, OH').first().waitFor()
  await leaves.getByText('Balance open').first().waitFor()
  for (const one of [buyer, seller]) await one.context().close()
}, 200_000)
