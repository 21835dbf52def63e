import { describe, expect, it } from 'vitest'

import { advice, saltGPerL, temperingMinutes } from '@/shared/domain/transport/advice.facts'
import { animals } from '@/shared/domain/transport/trips-for-tests'
import { sources } from '@/shared/sources'

describe('advice for either end of the way', () => {
  it('says where each piece comes from', () => {
    for (const { text, sourceKeys } of Object.values(advice)) {
      expect(text).toMatch(/^[A-Z].*\.$/)
      expect(sourceKeys.length).toBeGreaterThan(0)
      for (const key of sourceKeys) expect(sources[key]).toBeDefined()
    }
  })

  it('tempers by the difference: not at all, by floating, by the hour, never past 10 °C', () => {
    expect(temperingMinutes(20, 21.5)).toBe(0)
    expect(temperingMinutes(20, 16)).toBe(20)
    expect(temperingMinutes(18, 26)).toBe(96)
    expect(temperingMinutes(10, 21)).toBeNull()
    expect(temperingMinutes(NaN, 20)).toBeNull()
  })

  it('salts fish, tilapia more, crayfish and worms never', () => {
    expect(saltGPerL(animals('channel_catfish').species)).toEqual([1, 3])
    expect(saltGPerL(animals('nile_tilapia').species)).toEqual([5, 10])
    expect(saltGPerL(animals('redclaw_crayfish').species)).toBeNull()
    expect(saltGPerL(animals('red_wiggler').species)).toBeNull()
  })
})
