import type { Page } from 'playwright-core'

import { tabTo } from '@/tests/support/browser'

/** Tabs to a field and types into it, replacing what stands there. */
export async function typeInto(page: Page, name: string | RegExp, text: string): Promise<void> {
  await tabTo(page, name)
  await page.keyboard.press('Control+A')
  await page.keyboard.type(text)
}

/** Tabs to a control and presses a key on it. */
export async function pressOn(page: Page, name: string | RegExp, key = 'Enter'): Promise<void> {
  await tabTo(page, name)
  await page.keyboard.press(key)
}

/** Tabs to a day field, whose three parts take digits, and types month, day and year. */
export async function typeDay(page: Page, name: string | RegExp, day: string): Promise<void> {
  const [year, month, date] = day.split('-')
  await tabTo(page, name)
  await page.keyboard.type(`${month}${date}${year}`)
}
