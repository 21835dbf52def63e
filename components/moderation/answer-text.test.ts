import { expect, it } from 'vitest'

import { answerText, answerWords } from './answer-text'

it('names species by both names and choices in words', () => {
  expect(answerText('taxonId', 'bluegill')).toBe('Bluegill (Lepomis macrochirus)')
  expect(answerText('countMethod', 'sample-weight')).toBe('by weighed samples')
  expect(answerText('shipping.packing', 'carton-two-days')).toBe('Plain carton, two days')
  expect(answerText('shipping.boxCents', 1200)).toBe('$12.00')
  expect(answerText('sex', 'mixed')).toBe('mixed')
  expect(answerText('sizeLoMm', 57.15)).toBe('2¼ in')
})

it('puts each price and window on a line of its own', () => {
  const tiers = [
    { fromCount: 25, unitCents: 100 },
    { fromCount: 100, unitCents: 89 },
  ]
  expect(answerText('tiers', tiers)).toBe('from 25: $1.00\nfrom 100: $0.89')
})

it('keeps an answer it has no other words for, and nothing as nothing', () => {
  expect(answerWords('words', 'Graded; then fed.')).toBe('Graded; then fed.')
  expect(answerWords('taxonId', '')).toBe('')
})
