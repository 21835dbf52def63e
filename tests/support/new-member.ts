import type { Page } from 'playwright-core'

import { linkIn, waitForMail } from '@/tests/support/mailbox'

export const NEW_PASSWORD = 'lantern gravel otter 9'

export interface NewMember {
  name: string
  email: string
}

/** Pages behind the one in view stay mounted, hidden: only what is seen counts. */
export function field(page: Page, label: string | RegExp, exact = true) {
  return page.getByLabel(label, { exact }).filter({ visible: true })
}

/** Fills the form for a new account that is in view, and sends it. */
export async function fillSignUp(page: Page, { name, email }: NewMember): Promise<void> {
  await field(page, 'Your name').fill(name)
  await field(page, 'E-mail address').fill(email)
  await field(page, 'Password').fill(NEW_PASSWORD)
}

/** Opens the link of the mail that confirms an address: signed in afterwards. */
export async function confirmAddress(page: Page, mailOrigin: string, email: string): Promise<void> {
  const mail = await waitForMail(mailOrigin, { to: email, subject: 'Confirm your e-mail address' })
  await page.goto(linkIn(mail, /verify-email/))
  await page.getByText('Your e-mail address is confirmed').waitFor()
}
