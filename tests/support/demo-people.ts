import { readFile } from 'node:fs/promises'
import path from 'node:path'

import type { Page } from 'playwright-core'

import { bytesOfBase32, timeCode } from '@/scripts/time-code.mjs'

interface DemoPerson {
  role: string
  email: string
  password: string
  totpSecret?: string
}

const STEP_MS = 30_000
const SPARE_MS = 2_000

async function personOf(dataDir: string, role: string): Promise<DemoPerson> {
  const people = JSON.parse(await readFile(path.join(dataDir, 'demo-people.json'), 'utf8')) as DemoPerson[]
  const person = people.find((one) => one.role === role)
  if (!person) throw new Error(`no demo person is ${role}`)
  return person
}

/** What the authenticator of a demo person shows; waits for the next code when this one is nearly over. */
async function freshCode(secret: string): Promise<string> {
  const leftMs = STEP_MS - (Date.now() % STEP_MS)
  if (leftMs < SPARE_MS) await new Promise((done) => setTimeout(done, leftMs))
  return timeCode(bytesOfBase32(secret), Date.now() / 1000)
}

/** Signs somebody in on real pages, with the second factor where they have one. */
async function signIn(page: Page, { email, password, totpSecret }: Omit<DemoPerson, 'role'>): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.keyboard.press('Enter')
  if (totpSecret) {
    await page.waitForURL(/second-factor/)
    await page.getByLabel('Code from your app').fill(await freshCode(totpSecret))
    await page.keyboard.press('Enter')
  }
  await page.waitForURL((url) => !/sign-in|second-factor/.test(url.pathname))
}

/** One of the demo people that `npm start` prints. */
export async function signInDemo(page: Page, wish: { dataDir: string; role: string }): Promise<void> {
  await signIn(page, await personOf(wish.dataDir, wish.role))
}

/** One of the demo's other growers and farms: they share the password. */
export async function signInNeighbour(page: Page, wish: { dataDir: string; email: string }): Promise<void> {
  const { password } = await personOf(wish.dataDir, 'beginner')
  await signIn(page, { email: wish.email, password })
}
