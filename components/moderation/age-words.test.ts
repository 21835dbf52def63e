import { expect, it } from 'vitest'

import { ageWords } from './age-words'

const now = Date.parse('2027-01-15T12:00:00Z')
const before = (text: string) => ageWords(Date.parse(text), now)

it('says how long a listing waits', () => {
  expect(before('2027-01-15T11:59:30Z')).toBe('just now')
  expect(before('2027-01-15T11:20:00Z')).toBe('40 min')
  expect(before('2027-01-14T12:00:00Z')).toBe('24 h')
  expect(before('2027-01-12T11:00:00Z')).toBe('3 days')
})

it('never shows an age below nothing when clocks differ', () => {
  expect(before('2027-01-15T12:05:00Z')).toBe('just now')
})
