import { describe, expect, it } from 'vitest'

import { passwordFault } from '@/server/auth/password-fault'

describe('choosing a password', () => {
  it.each([
    'password1234',
    'Passw0rd!2026',
    'qwertyuiop12',
    '123456789012',
    'aaaaaaaaaaaa',
    'iloveyou12345',
    'P@ssw0rd1234',
    'letmein123456',
  ])('refuses the common %s', (password) => expect(passwordFault(password, 'ann@example.org')).not.toBeNull())

  it.each(['gravel otter bucket', 'correct horse battery', 'vV9#kk-Trellis', 'x'.repeat(10) + 'plmoknijb'])(
    'accepts %s',
    (password) => expect(passwordFault(password, 'ann@example.org')).toBeNull(),
  )

  it('accepts a passphrase of 128 characters and refuses 129', () => {
    const phrase = 'ember lagoon thicket saddle '.repeat(5)
    expect(passwordFault(phrase.slice(0, 128), '')).toBeNull()
    expect(passwordFault(phrase.slice(0, 129), '')).not.toBeNull()
  })

  it('refuses one that holds the name before the @', () => {
    expect(passwordFault('margaret-lagoon-7', 'margaret@example.org')).not.toBeNull()
  })
})
