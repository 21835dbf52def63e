import { beforeAll, describe, expect, it } from 'vitest'

import {
  configureUnsubscribe,
  readUnsubscribeToken,
  writeUnsubscribeToken,
} from '@/server/mail/unsubscribe-token'

const leaving = { list: 'reminders', memberId: '6f1c2f64-0000-4000-8000-000000000001' } as const

describe('the token of an unsubscribe link', () => {
  beforeAll(() => configureUnsubscribe({ origin: 'https://tankward.example', secret: 'a'.repeat(40) }))

  it('names one list of one member', () => {
    expect(readUnsubscribeToken(writeUnsubscribeToken(leaving))).toEqual(leaving)
  })

  it('is worth nothing when any character differs, when cut, or for another member', () => {
    const token = writeUnsubscribeToken(leaving)
    for (let at = 0; at < token.length; at++) {
      const other = token[at] === 'A' ? 'B' : 'A'
      expect(readUnsubscribeToken(token.slice(0, at) + other + token.slice(at + 1)), `at ${at}`).toBeNull()
    }
    const other = Buffer.from(`reminders:${leaving.memberId.replace('1', '2')}`).toString('base64url')
    const forged = [token.slice(0, -1), `${token}.`, '', '.', `${other}.${token.split('.')[1]}`]
    for (const one of forged) expect(readUnsubscribeToken(one), one).toBeNull()
  })

  it('is worth nothing under another secret', () => {
    const token = writeUnsubscribeToken(leaving)
    configureUnsubscribe({ origin: 'https://tankward.example', secret: 'b'.repeat(40) })
    expect(readUnsubscribeToken(token)).toBeNull()
  })
})
