import { describe, expect, it } from 'vitest'

import { findMedia } from '@/shared/domain/media/find-media'
import { heatCaution } from '@/shared/domain/worms/heat-treated'
import { countInWeight, packedWeightWords } from '@/shared/domain/worms/worm-count'
import { gramsPerPound } from '@/shared/units/mass'

describe('worms by packed weight', () => {
  it('says about how many that is, from the figures of the species', () => {
    expect(countInWeight('red_wiggler', gramsPerPound)).toEqual([800, 1200])
    expect(countInWeight('european_nightcrawler', gramsPerPound / 2)).toEqual([150, 200])
    expect(packedWeightWords('red_wiggler', gramsPerPound / 2)).toBe(
      '8 oz (227 g) when packed. They lose water on the way and take it up again. About 400 to 600 worms.',
    )
    expect(packedWeightWords('black_soldier_fly_larvae', gramsPerPound)).toContain('2,300 to 4,500 larvae')
  })

  it('names no count where nobody gives one', () => {
    expect(countInWeight('canadian_nightcrawler', 500)).toBeNull()
    expect(packedWeightWords('canadian_nightcrawler', 500)).not.toContain('About')
  })
})

describe('heat treatment', () => {
  const castings = findMedia('worm_castings')
  const gravel = findMedia('gravel')
  it('is said of castings and not of gravel', () => {
    if (!castings || !gravel) throw new Error('no media')
    expect(heatCaution(castings, 'yes')).toBeNull()
    expect(heatCaution(castings, 'no')).toBe(
      'Not heat treated: it may hold worms or their eggs. Compost heated to 131 °F (55 °C) holds none.',
    )
    expect(heatCaution(castings, 'unknown')).toContain('Nobody knows')
    expect(heatCaution(gravel, 'no')).toBeNull()
  })
})
