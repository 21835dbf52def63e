import { readFile } from 'node:fs/promises'
import path from 'node:path'

import mysql from 'mysql2/promise'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'

const { origin, dataDir, databaseUrl } = inject('wholeProduct')
const UNREAD = 3
let browser: TestBrowser
let people: { role: string; email: string; password: string }[]

beforeAll(async () => {
  browser = await openBrowser()
  people = JSON.parse(await readFile(path.join(dataDir, 'demo-people.json'), 'utf8')) as typeof people
})
afterAll(() => browser.close())

/** How many of a demo person's notices are new hangs on the day of the demo: here it is always the latest three. */
async function forgetReading(email: string): Promise<void> {
  const connection = await mysql.createConnection({ uri: databaseUrl })
  const mine = 'member_id = (SELECT id FROM user WHERE email = ?)'
  await connection.query(`UPDATE notice SET read_at = created_at WHERE ${mine}`, [email])
  await connection.query(`UPDATE notice SET read_at = NULL WHERE ${mine} ORDER BY id DESC LIMIT ${UNREAD}`, [
    email,
  ])
  await connection.end()
}

async function signIn(page: Page, role: string): Promise<void> {
  const member = people.find((person) => person.role === role)
  if (!member) throw new Error(`the demo has no ${role}`)
  await forgetReading(member.email)
  await page.goto('/sign-in?returnTo=/me')
  await page.getByLabel('E-mail').fill(member.email)
  await page.getByLabel('Password', { exact: true }).fill(member.password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.getByRole('heading', { name: 'Notices by mail' }).waitFor()
}

const overflow = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)

describe.each([
  { width: 390, theme: 'light' as const, role: 'hatchery' },
  { width: 1280, theme: 'dark' as const, role: 'beginner' },
])('a member ($role) who is told of their orders, $width wide', ({ width, theme, role }) => {
  it('finds the bell, follows a notice, reads all, and chooses what comes by mail', async () => {
    const page = await browser.openPage({ width, theme, origin })
    await signIn(page, role)
    const bell = page.getByRole('link', { name: `Notices, ${UNREAD} unread` })
    await bell.waitFor()
    await keepShot(page, `me-${width}`)
    await expectNoAxeViolations(page)
    await bell.click()
    await page.getByRole('heading', { name: 'Notices', level: 1 }).waitFor()
    const rows = page.getByRole('listitem')
    await rows.first().waitFor()
    expect(await rows.count()).toBeGreaterThan(2)
    expect(await overflow(page)).toBe(0)
    await keepShot(page, `notices-${width}`)
    await expectNoAxeViolations(page)

    await rows.filter({ hasText: 'New' }).first().getByRole('link').click()
    await page.waitForURL(/\/(orders|listings|sell\/listings)\/[\w-]{22}$/)
    await page.goto('/notices')
    await expect.poll(() => rows.filter({ hasText: 'New' }).count()).toBe(UNREAD - 1)
    await page.getByRole('button', { name: 'Mark all read' }).click()
    await expect.poll(() => rows.filter({ hasText: 'New' }).count()).toBe(0)
    await page.getByRole('button', { name: 'Mark all read' }).waitFor({ state: 'detached' })

    await page.goto('/me')
    const reminders = page.getByRole('switch', { name: 'Reminders before a pickup' })
    await page.getByRole('switch', { name: 'Quiet hours' }).click()
    await page.getByLabel('From').waitFor()
    await page.getByLabel('Until').fill('06:30')
    await page.getByRole('button', { name: 'Keep these hours' }).click()
    await page.getByText('Quiet hours kept.').first().waitFor()
    await keepShot(page, `me-quiet-${width}`)
    await expectNoAxeViolations(page)
    await page.getByRole('switch', { name: 'Quiet hours' }).click()
    await page.getByText('Quiet hours are off.').first().waitFor()
    await reminders.click()
    await page.getByRole('switch', { name: 'Quiet hours' }).waitFor({ state: 'detached' })
    await reminders.click()
    await page.getByRole('switch', { name: 'Quiet hours' }).waitFor()
    await page.context().close()
  })
})
