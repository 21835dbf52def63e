import { expect, it } from 'vitest'

import { reasonChoices, reasonOfKey } from './decision-words'

it('gives every reason a key of its own, printed in front of it', () => {
  expect(new Set(reasonChoices.map(({ label }) => label.charAt(0))).size).toBe(reasonChoices.length)
  for (const { value, label } of reasonChoices) expect(reasonOfKey(label.charAt(0))).toBe(value)
})

it('knows no other keys', () => {
  expect(reasonOfKey('x')).toBeUndefined()
  expect(reasonOfKey('Enter')).toBeUndefined()
})
