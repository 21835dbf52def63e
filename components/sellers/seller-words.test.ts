import { describe, expect, it } from 'vitest'

import { answerWords, ratingWords, sinceWords } from './seller-words'

describe("a seller's record, in words", () => {
  it('does not rate whom nobody has rated', () => {
    expect(ratingWords({})).toBe('No ratings yet')
    expect(answerWords({})).toBe('')
  })

  it('counts singular and plural right', () => {
    expect(ratingWords({ rating: { mean: 5, count: 1 } })).toBe('5.0 of 5 from 1 rating')
    expect(answerWords({ answerRate: { inTime: 18, asked: 20 } })).toBe('Answered 18 of 20 requests in time')
  })

  it('names the month, wherever the reader is', () => {
    expect(sinceWords({ since: '2026-03-01' })).toBe('Here since March 2026')
  })
})
