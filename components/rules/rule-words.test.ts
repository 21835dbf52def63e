import { describe, expect, it } from 'vitest'

import { confidenceWords, reasonTitle, statusWords } from './rule-words'

describe('a rule in words', () => {
  it('never makes an unread letter look sure', () => {
    expect(confidenceWords({ confidence: 'P' })).toMatch(/source itself/)
    expect(confidenceWords({ confidence: 'Z' })).toMatch(/do not know/)
  })

  it('names act and place', () => {
    expect(reasonTitle({ activity: 'possess', jurisdiction: 'OH' })).toBe('Keeping: Ohio')
    expect(reasonTitle({ activity: 'import', jurisdiction: 'US' })).toBe('Importing: United States')
  })

  it('reads an unknown status as unchecked, never as allowed', () => {
    expect(statusWords('allowed-ish')).toBe('Nobody has checked this for us')
  })
})
