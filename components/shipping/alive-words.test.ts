import { expect, it } from 'vitest'

import { aliveError, aliveOutcome } from './alive-words'

it('takes a count from none to all that were sent', () => {
  expect(aliveError('', 40)).toMatch(/0 is an answer/)
  expect(aliveError('41', 40)).toBe('Only 40 were sent.')
  expect(aliveError('0', 40)).toBeNull()
  expect(aliveError('40', 40)).toBeNull()
})

it('says what follows from it', () => {
  expect(aliveOutcome(40, 40)).toBe('All alive: the claim ends and the seller is paid.')
  expect(aliveOutcome(38, 40)).toMatch(/^2 lost: a moderator decides/)
})
