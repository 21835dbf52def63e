import { randomInt } from 'node:crypto'
import { mkdir } from 'node:fs/promises'
import path from 'node:path'

import { AxeBuilder } from '@axe-core/playwright'
import { chromium, type Browser, type Locator, type Page } from 'playwright-core'
import { expect } from 'vitest'

import { findChromium } from '@/scripts/find-program.mjs'

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]
const SHOTS = path.resolve('.data/shots')
const MOST_TAB_STOPS = 200

export interface PageChoice {
  /** CSS pixels: 390 is our phone, 1280 our desk. */
  width?: number
  height?: number
  theme?: 'light' | 'dark'
  /** Paths given to page.goto are relative to it. */
  origin?: string
}

export interface TestBrowser {
  /** A page with cookies and storage of its own. */
  openPage: (choice?: PageChoice) => Promise<Page>
  close: () => Promise<void>
}

/** One Chromium a test file; close it in afterAll. */
export async function openBrowser(): Promise<TestBrowser> {
  const executablePath = await findChromium()
  if (!executablePath) throw new Error('Chromium is not installed: node scripts/prepare.mjs test installs it')
  const browser: Browser = await chromium.launch({ executablePath, args: FLAGS })
  return {
    async openPage({ width = 390, height = width < 700 ? 844 : 900, theme = 'light', origin } = {}) {
      const context = await browser.newContext({
        viewport: { width, height },
        colorScheme: theme,
        reducedMotion: 'reduce',
        hasTouch: width < 700,
        timezoneId: 'America/New_York',
        locale: 'en-US',
        baseURL: origin,
        // Each page is somebody else at home: limits by address must not add up over a test run.
        extraHTTPHeaders: {
          'x-forwarded-for': `10.${randomInt(256)}.${randomInt(256)}.${randomInt(1, 255)}`,
        },
      })
      return context.newPage()
    },
    close: () => browser.close(),
  }
}

/** Keeps the whole page as .data/shots/<name>.png, to be looked at by eye. */
export async function keepShot(page: Page, name: string): Promise<string> {
  await mkdir(SHOTS, { recursive: true })
  const file = path.join(SHOTS, `${name}.png`)
  await page.screenshot({ path: file, fullPage: true })
  return file
}

/** Fails with the rule and the element of each finding, best-practice rules included. */
export async function expectNoAxeViolations(page: Page): Promise<void> {
  // A frame in which no script may run (the mail catcher's) would let axe wait for ever.
  const builder = new AxeBuilder({ page }).exclude('iframe[sandbox]:not([sandbox~="allow-scripts"])')
  const { violations } = await builder.analyze()
  const findings = violations.flatMap(({ id, nodes }) => nodes.map((node) => `${id}: ${node.html}`))
  expect(findings, `accessibility of ${page.url()}`).toEqual([])
}

/** The accessible name of a control; empty when it has none. */
export async function nameOf(control: Locator): Promise<string> {
  const snapshot = await control.ariaSnapshot()
  return /^- \S+ "((?:[^"\\]|\\.)*)"/.exec(snapshot)?.[1]?.replaceAll('\\"', '"') ?? ''
}

/** The accessible name of what has the keyboard focus; empty when nothing has. */
export async function focusedName(page: Page): Promise<string> {
  const focused = page.locator(':focus')
  return (await focused.count()) === 0 ? '' : nameOf(focused.first())
}

/** Presses Tab until the control of that accessible name has the focus; fails when the keyboard cannot get there. */
export async function tabTo(page: Page, name: string | RegExp): Promise<void> {
  const met: string[] = []
  for (let stop = 0; stop < MOST_TAB_STOPS; stop++) {
    await page.keyboard.press('Tab')
    const here = await focusedName(page)
    if (typeof name === 'string' ? here === name : name.test(here)) return
    met.push(here)
  }
  throw new Error(`Tab never reached ${name}; it met: ${[...new Set(met)].join(' | ')}`)
}
