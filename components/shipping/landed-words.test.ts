import { expect, it } from 'vitest'

import { landedWords } from './landed-words'

it('puts the cost of one at the door beside the cost of one at the gate', () => {
  expect(
    landedWords(40, {
      shipped: { totalCents: 9240, landedCents: 231, boxes: 1 },
      collected: { totalCents: 3800, landedCents: 95, boxes: 0 },
    }),
  ).toBe('40 shipped: $2.31 each at your end, all in ($92.40 in 1 box). Collected: $0.95 each ($38.00).')
})
