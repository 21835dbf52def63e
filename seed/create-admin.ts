import { randomInt } from 'node:crypto'
import { parseArgs } from 'node:util'

import { hashPassword } from 'better-auth/crypto'
import { z } from 'zod'

import { connect, disconnect } from '@/db/client'
import { countAdmins, insertAdmin } from '@/server/auth/admin-store'
import { readSettings } from '@/server/env'

// No 0, O, 1, l or I: it is typed once from a terminal.
const LETTERS = 'abcdefghijkmnpqrstuvwxyzABCDEFGHJKLMNPQRSTUVWXYZ23456789'

const password = Array.from({ length: 4 }, () =>
  Array.from({ length: 5 }, () => LETTERS[randomInt(LETTERS.length)]).join(''),
).join('-')

/** `npm run admin:create -- --email you@example.org --name "Your Name"`: the first admin, and only the first. */
async function main(): Promise<string> {
  const { values } = parseArgs({ options: { email: { type: 'string' }, name: { type: 'string' } } })
  const email = z.email().safeParse(values.email?.toLowerCase())
  const name = values.name?.trim()
  if (!email.success || !name) {
    throw new Error('Say who: npm run admin:create -- --email you@example.org --name "Your Name"')
  }
  connect(readSettings().DATABASE_URL, 1)
  if ((await countAdmins()) > 0) throw new Error('There is an admin already; they can make others.')
  await insertAdmin({ name, email: email.data, passwordHash: await hashPassword(password) })
  return `${name} <${email.data}> is the admin.\nPassword, shown only now: ${password}\nSign in, change it, and set up the second factor: staff pages stay closed until then.`
}

try {
  process.stdout.write(`${await main()}\n`)
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
  process.exitCode = 1
} finally {
  await disconnect()
}
