import { execFile } from 'node:child_process'
import { promisify } from 'node:util'

import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

const run = promisify(execFile)
let database: TestDatabase
beforeAll(async () => {
  database = await freshDatabase('first_admin')
})
afterAll(() => database.drop())

async function createAdmin(...args: string[]): Promise<{ code: number; said: string }> {
  const env = {
    ...process.env,
    NODE_ENV: 'development' as const,
    DATABASE_URL: database.url,
    PUBLIC_ORIGIN: 'http://127.0.0.1:8080',
    AUTH_SECRET: 'a-secret-of-thirty-two-characters-or-more',
    STRIPE_SECRET_KEY: 'sk_test_nothing',
    STRIPE_WEBHOOK_SECRET: 'whsec_nothing',
    SMTP_URL: 'smtp://127.0.0.1:25',
    UPLOAD_DIR: '.data/uploads',
  }
  try {
    const { stdout } = await run('node', ['--import', 'tsx', 'seed/create-admin.ts', ...args], { env })
    return { code: 0, said: stdout }
  } catch (error) {
    const failed = error as { code?: number; stderr?: string }
    return { code: failed.code ?? -1, said: failed.stderr ?? '' }
  }
}

describe('the first admin', () => {
  it('is made by one command, and only once', async () => {
    const nobody = await createAdmin()
    expect(nobody.code).toBe(1)
    expect(nobody.said).toContain('Say who')
    const first = await createAdmin('--email', 'Head@example.org', '--name', 'Head of house')
    expect(first.said).toContain('head@example.org')
    expect(first.said).toMatch(/Password, shown only now: (\w{5}-){3}\w{5}/)
    const second = await createAdmin('--email', 'other@example.org', '--name', 'Other')
    expect([second.code, second.said]).toEqual([1, expect.stringContaining('There is an admin already')])
  })
})
