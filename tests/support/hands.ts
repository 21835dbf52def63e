import type { Page } from 'playwright-core'

import { nameOf, tabTo } from '@/tests/support/browser'
import { pressOn, typeDay, typeInto } from '@/tests/support/by-keyboard'

type Name = string | RegExp

/** How somebody works a page: the same journey by finger and by keyboard alone. */
export interface Hands {
  press: (name: Name) => Promise<void>
  tick: (name: Name) => Promise<void>
  type: (name: Name, text: string) => Promise<void>
  typeDay: (name: Name, day: string) => Promise<void>
  /** A link by where it leads. */
  follow: (href: string) => Promise<void>
}

/** What is open on top, or else the page. */
const scopeOf = async (page: Page) => {
  const dialog = page.getByRole('dialog').filter({ visible: true })
  return (await dialog.count()) > 0 ? dialog.last() : page.locator('main').filter({ visible: true })
}

export function fingers(page: Page): Hands {
  return {
    press: async (name) => (await scopeOf(page)).getByRole('button', { name }).last().click(),
    tick: async (name) => (await scopeOf(page)).getByRole('checkbox', { name }).click(),
    type: async (name, text) => (await scopeOf(page)).getByRole('textbox', { name }).first().fill(text),
    typeDay: async (name, day) => (await scopeOf(page)).getByLabel(name).first().fill(day),
    follow: (href) => page.locator(`main a[href="${href}"]`).filter({ visible: true }).first().click(),
  }
}

export function keyboard(page: Page): Hands {
  return {
    press: (name) => pressOn(page, name),
    tick: (name) => pressOn(page, name, 'Space'),
    type: (name, text) => typeInto(page, name, text),
    typeDay: (name, day) => typeDay(page, name, day),
    follow: async (href) => {
      const link = page.locator(`main a[href="${href}"]`).filter({ visible: true }).first()
      await link.waitFor()
      await tabTo(page, await nameOf(link))
      await page.keyboard.press('Enter')
    },
  }
}
