import { describe, expect, it } from 'vitest'

import { flagWords } from './flag-words'

describe('flags in words', () => {
  it('names the species, the field and the kind of contact', () => {
    expect(flagWords('names-blocked:channidae').word).toContain('Names a species we do not list')
    expect(flagWords('names-other:yellow_perch').word).toBe('Names another species: Yellow perch')
    expect(flagWords('hides-for:water.temperatureC').word).toBe('Changed, off sale: Water temperature')
    expect(flagWords('contact:phone').word).toBe('Text holds a phone number')
  })

  it('shows a flag nobody has words for as it is', () => {
    expect(flagWords('moon-phase:full').word).toBe('moon-phase:full')
    expect(flagWords('toString').word).toBe('toString')
  })
})
