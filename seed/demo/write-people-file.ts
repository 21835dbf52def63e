import { rename, writeFile } from 'node:fs/promises'

import { DEMO_PASSWORD, namedPeople } from '@/seed/demo/named-people.facts'

const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567'

/** RFC 4648 base 32, as an authenticator takes it. */
function base32(text: string): string {
  const bits = [...Buffer.from(text, 'utf8')].map((byte) => byte.toString(2).padStart(8, '0')).join('')
  return (bits.match(/.{1,5}/g) ?? []).map((five) => LETTERS[parseInt(five.padEnd(5, '0'), 2)]).join('')
}

/** Who can sign in, for the start command to print. Readable by its owner only. */
export async function writePeopleFile(file: string): Promise<void> {
  const people = namedPeople.map(({ role, email, note, factorSecret }) => ({
    ...{ role, email, password: DEMO_PASSWORD, note },
    ...(factorSecret ? { totpSecret: base32(factorSecret) } : {}),
  }))
  await writeFile(`${file}.new`, JSON.stringify(people, null, 2), { mode: 0o600 })
  await rename(`${file}.new`, file)
}
