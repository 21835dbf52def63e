import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { readSettings, type FakeSettings } from './settings'
import { startFake } from './start-fake'

const CONTROL_TOKEN = 'control-for-tests'

export interface TestFake {
  port: number
  origin: string
  settings: FakeSettings
  /** `POST /_control/<what>`; throws what the control says when it refuses. */
  control(what: string, body?: object): Promise<Record<string, unknown>>
  /** Fills in a page and presses its button; answers the redirect's address, or the page itself. */
  submit(
    address: string,
    fields: Record<string, string>,
  ): Promise<{ status: number; next: string | null; text: string }>
  /** Pays an open page as a person would, up to the first answer. */
  pay(address: string, cardNumber: string): Promise<{ status: number; next: string | null; text: string }>
  /** Ends it; the books are thrown away unless they are to be opened again. */
  stop(keepBooks?: boolean): Promise<void>
}

async function submit(address: string, fields: Record<string, string>) {
  const response = await fetch(address, {
    method: 'POST',
    body: new URLSearchParams(fields),
    redirect: 'manual',
  })
  return { status: response.status, next: response.headers.get('location'), text: await response.text() }
}

/** The practice processor in this process, on a free port, with books of its own in the temporary folder. */
export async function startTestFake(wanted: Partial<FakeSettings> = {}): Promise<TestFake> {
  const booksFolder = wanted.booksFolder ?? mkdtempSync(join(tmpdir(), 'payments-fake-'))
  const settings: FakeSettings = {
    ...readSettings([], {}),
    controlToken: CONTROL_TOKEN,
    webhookFirstGapMs: 20,
    ...wanted,
    booksFolder,
  }
  const fake = await startFake(settings)
  return {
    port: fake.port,
    origin: fake.origin,
    settings,
    submit,
    async control(what, body = {}) {
      const response = await fetch(`${fake.origin}/_control/${what}`, {
        method: 'POST',
        headers: { 'x-control-token': CONTROL_TOKEN },
        body: JSON.stringify(body),
      })
      const told: Record<string, unknown> = await response.json()
      if (!response.ok) throw new Error(String(told.error))
      return told
    },
    pay: (address, cardNumber) =>
      submit(address, { cardNumber, expiry: '12/40', cvc: '123', name: 'Ada Marsh' }),
    async stop(keepBooks = false) {
      await fake.stop()
      if (!keepBooks) rmSync(booksFolder, { recursive: true, force: true })
    },
  }
}
