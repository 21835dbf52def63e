import { describe, expect, it } from 'vitest'

import { bytesOfBase32, timeCode } from '@/scripts/time-code.mjs'

// RFC 6238 (2011), appendix B: eight digits, 30 seconds; the secret is the digits 1 to 0 repeated to the hash's length.
const SECRETS = { sha1: 20, sha256: 32, sha512: 64 } as const
const PUBLISHED: [atSeconds: number, sha1: string, sha256: string, sha512: string][] = [
  [59, '94287082', '46119246', '90693936'],
  [1111111109, '07081804', '68084774', '25091201'],
  [1111111111, '14050471', '67062674', '99943326'],
  [1234567890, '89005924', '91819424', '93441116'],
  [2000000000, '69279037', '90698825', '38618901'],
  [20000000000, '65353130', '77737706', '47863826'],
]

// RFC 4648 (2006), section 10.
const BASE32: [text: string, bytes: string][] = [
  ['', ''],
  ['MY======', 'f'],
  ['MZXQ====', 'fo'],
  ['MZXW6===', 'foo'],
  ['MZXW6YQ=', 'foob'],
  ['MZXW6YTB', 'fooba'],
  ['MZXW6YTBOI======', 'foobar'],
]

const secretOf = (bytes: number) => Buffer.from('1234567890'.repeat(7).slice(0, bytes))

describe('time-based codes', () => {
  it.each(PUBLISHED)('agree with the published ones at %i s', (atSeconds, ...codes) => {
    const ours = (['sha1', 'sha256', 'sha512'] as const).map((hash) =>
      timeCode(secretOf(SECRETS[hash]), atSeconds, { digits: 8, hash }),
    )
    expect(ours).toEqual(codes)
  })

  it('keep their leading zeros at six digits', () => {
    expect(timeCode(secretOf(20), 1111111109)).toBe('081804')
  })

  it.each(BASE32)('read the base32 text "%s" as the RFC does', (text, bytes) => {
    expect(bytesOfBase32(text).toString()).toBe(bytes)
  })

  it('read secrets as people type them, and refuse what is no base32', () => {
    expect(bytesOfBase32('mzxw 6ytb oi').toString()).toBe('foobar')
    expect(() => bytesOfBase32('MZXW1')).toThrow(/no letter/)
  })
})
