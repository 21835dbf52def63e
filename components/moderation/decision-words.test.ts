import { expect, it } from 'vitest'

import { reasonChoices, reasonOfKey } from './decision-words'

import { reviewReasonWords } from '@/components/selling/review-reasons'

it('offers every reason, each with a key of its own', () => {
  expect(reasonChoices.map((choice) => choice.value)).toEqual(Object.keys(reviewReasonWords))
  expect(new Set(reasonChoices.map(({ label }) => label.charAt(0))).size).toBe(reasonChoices.length)
  for (const { value, label } of reasonChoices) expect(reasonOfKey(label.charAt(0))).toBe(value)
})

it('knows no other keys', () => {
  expect(reasonOfKey('x')).toBeUndefined()
  expect(reasonOfKey('Enter')).toBeUndefined()
})
