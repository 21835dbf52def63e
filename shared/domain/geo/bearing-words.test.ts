import { describe, expect, it } from 'vitest'

import { bearingWords } from '@/shared/domain/geo/bearing-words'

const cincinnati = { lat: 39.125, lng: -84.525 }

describe('which way a seller lies', () => {
  it.each([
    ['north', 40.125, -84.525],
    ['north-east', 39.875, -83.525],
    ['east', 39.125, -83.525],
    ['south-east', 38.325, -83.525],
    ['south', 38.125, -84.525],
    ['south-west', 38.325, -85.525],
    ['west', 39.125, -85.525],
    ['north-west', 39.875, -85.525],
  ])('says %s', (words, lat, lng) => expect(bearingWords(cincinnati, { lat, lng })).toBe(words))

  it('goes the short way over the date line', () => {
    expect(bearingWords({ lat: 52, lng: 179.9 }, { lat: 52, lng: -179.9 })).toBe('east')
  })

  it('has no direction inside one cell', () => {
    expect(bearingWords(cincinnati, { ...cincinnati })).toBeNull()
  })
})
