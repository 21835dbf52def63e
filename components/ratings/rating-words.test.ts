import { describe, expect, it } from 'vitest'

import { hiddenWords, survivalWords } from './rating-words'

describe('ratings in words', () => {
  it('says survival with both counts', () => {
    expect(survivalWords({ alive: 188, handedOver: 200, answered: 9, asked: 11 })).toBe(
      'Alive after 7 days: 188 of 200 fish, 9 of 11 orders answered',
    )
  })
  it('claims nothing before the first answer, nor before the first question', () => {
    expect(survivalWords({ alive: 0, handedOver: 0, answered: 0, asked: 1 })).toBe(
      'Alive after 7 days: not told yet, 0 of 1 order answered',
    )
    expect(survivalWords(undefined)).toBe('')
  })
  it('names the reason for hidden words', () => {
    expect(hiddenWords('not-this-order')).toBe('Words hidden by a moderator: not about this order')
  })
})
