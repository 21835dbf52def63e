import { describe, expect, it } from 'vitest'

import { appliedWords } from './applied-words'

describe('filters in use, in words', () => {
  it('says each wish in the units of the reader', () => {
    const state = { species: 'nile_tilapia', sizeFromMm: 51, sizeToMm: 76, count: 20, mostCents: 150 }
    expect(appliedWords(state, 'us').map(({ words }) => words)).toEqual([
      'Nile tilapia',
      '2–3 in',
      '20 wanted',
      'Up to $1.50 each',
    ])
    expect(appliedWords(state, 'metric').map(({ words }) => words)).toContain('5–7.5 cm')
  })

  it('takes both ends of a range off at once', () => {
    const [size] = appliedWords({ sizeToMm: 102 }, 'us')
    expect(size).toEqual({
      words: 'Up to 4 in',
      anyWords: 'any size',
      off: { sizeFromMm: undefined, sizeToMm: undefined },
    })
  })

  it('names the week of shipping by its Monday', () => {
    const words = (thisMonday?: string) => appliedWords({ shipWeek: 15 }, 'us', thisMonday)[0]?.words
    expect(words('2027-01-11')).toBe('Can be shipped, week of Apr 12')
    expect(words('2027-04-12')).toBe('Can be shipped this week')
    expect(words()).toBe('Can be shipped')
  })

  it('leaves out place, distance and order', () => {
    expect(appliedWords({ near: '45202', withinKm: 41, sort: 'cheapest' }, 'us')).toEqual([])
  })
})
