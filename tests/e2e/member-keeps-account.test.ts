import { randomInt } from 'node:crypto'

import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest'

import { expectNoAxeViolations, keepShot, openBrowser, type TestBrowser } from '@/tests/support/browser'
import { linkIn, waitForMail } from '@/tests/support/mailbox'
import { confirmAddress, field, fillSignUp, NEW_PASSWORD } from '@/tests/support/new-member'

const { origin, mailOrigin } = inject('wholeProduct')
const SECOND_PASSWORD = 'thicket saddle ember 4'
let browser: TestBrowser
beforeAll(async () => {
  browser = await openBrowser()
})
afterAll(() => browser.close())

async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in?returnTo=/account')
  await field(page, 'E-mail address').fill(email)
  await field(page, 'Password').fill(password)
  await page.keyboard.press('Enter')
  await page.getByRole('heading', { name: 'Where you are signed in' }).waitFor()
}

const overflow = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)
const theme = (page: Page) => page.evaluate(() => document.documentElement.getAttribute('data-theme'))

describe('a member with a phone and a desk', () => {
  it('sees both, keeps one look for both, and changes password and address', async () => {
    const email = `keeper-${randomInt(1e9)}@example.org`
    const phone = await browser.openPage({ width: 390, origin })
    const desk = await browser.openPage({ width: 1280, origin })
    await phone.goto('/sign-up')
    await fillSignUp(phone, { name: 'Kit Keeper', email })
    await phone.keyboard.press('Enter')
    await phone.getByRole('heading', { name: 'Look into your mailbox' }).waitFor()
    await confirmAddress(phone, mailOrigin, email)
    await signIn(desk, email, NEW_PASSWORD)

    await phone.goto('/account')
    await phone.getByText('This one').waitFor()
    expect(await phone.getByRole('listitem').count()).toBe(2)
    expect(await overflow(phone)).toBe(0)
    await keepShot(phone, 'account-390')
    await expectNoAxeViolations(phone)

    await phone.getByRole('radio', { name: 'Dark' }).click()
    await expect.poll(() => theme(phone)).toBe('dark')
    await expect.poll(async () => (await (await phone.request.get('/api/v1/me')).json()).theme).toBe('dark')
    expect(await theme(desk)).toBeNull()
    await desk.reload()
    await expect.poll(() => theme(desk)).toBe('dark')
    await keepShot(desk, 'account-1280')
    await expectNoAxeViolations(desk)

    const password = phone.getByRole('form', { name: 'Change the password' })
    await password.getByLabel('Current password', { exact: true }).fill('not my password')
    await password.getByLabel('New password', { exact: true }).fill(SECOND_PASSWORD)
    await password.getByRole('button', { name: 'Change my password' }).click()
    await password.getByText('That is not your password.').first().waitFor()
    await password.getByLabel('Current password', { exact: true }).fill(NEW_PASSWORD)
    await password.getByRole('button', { name: 'Change my password' }).click()
    await phone.getByText('Your password is changed').waitFor()
    await phone.getByText('Nowhere else.').waitFor()
    await desk.reload()
    await desk.getByRole('link', { name: 'Sign in first' }).waitFor()

    const fresh = `fresh-${email}`
    const address = phone.getByRole('form', { name: 'Change the e-mail address' })
    await address.getByLabel('New e-mail address').fill(fresh)
    await address.getByLabel('Current password', { exact: true }).fill(SECOND_PASSWORD)
    await address.getByRole('button', { name: 'Mail me the link' }).click()
    await phone.getByText('Look into your new mailbox').waitFor()
    await waitForMail(mailOrigin, { to: email, subject: 'is to get another e-mail address' })
    const mail = await waitForMail(mailOrigin, { to: fresh, subject: 'Confirm your new e-mail address' })
    await phone.goto(linkIn(mail, /verify-email/))
    await phone.getByText('Your e-mail address is confirmed').waitFor()
    await signIn(desk, fresh, SECOND_PASSWORD)
    await desk.getByText(fresh).first().waitFor()
    for (const page of [phone, desk]) await page.context().close()
  })
})
