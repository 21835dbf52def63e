import { describe, expect, it } from 'vitest'

import { findMedia } from '@/shared/domain/media/find-media'
import type { MediaMaterial } from '@/shared/domain/media/media.facts'
import { carLoadWords, expectedVolumeL, judgeStatedWeight } from '@/shared/domain/media/media-weight'

const material = (id: string): MediaMaterial => {
  const found = findMedia(id)
  if (!found) throw new Error(`no material ${id}`)
  return found
}

describe('what media weighs', () => {
  it('tells the load in the car in both systems', () => {
    expect(carLoadWords(4, 14)).toBe('4 units weigh about 123 lb (56 kg) in the car.')
    expect(carLoadWords(1, 80)).toBe('1 unit weighs about 176 lb (80 kg) in the car.')
  })

  it('asks about a weight that does not fit the volume, and refuses none', () => {
    expect(judgeStatedWeight(material('expanded_clay'), { litres: 50, weightKg: 14 }).verdict).toBe('fits')
    const heavy = judgeStatedWeight(material('expanded_clay'), { litres: 50, weightKg: 80 })
    expect([heavy.verdict, heavy.saying]).toEqual([
      'caution',
      'Expanded clay: dry, that volume usually weighs 28 lb (13 kg) to 55 lb (25 kg). Is it wet, or is the volume larger?',
    ])
    const light = judgeStatedWeight(material('gravel'), { litres: 50, weightKg: 20 })
    expect(light.saying).toContain('Is the volume smaller?')
  })

  it('lets the published edges themselves pass', () => {
    for (const weightKg of [75, 85])
      expect(judgeStatedWeight(material('gravel'), { litres: 50, weightKg }).verdict).toBe('fits')
  })

  it('holds no opinion where nobody gives a figure', () => {
    expect(judgeStatedWeight(material('worm_castings'), { litres: 20, weightKg: 1 })).toEqual({
      verdict: 'unknown',
      expectedKg: null,
      saying: null,
    })
    expect(expectedVolumeL(material('other'), 10)).toBeNull()
  })

  it('goes from weight to volume too', () => {
    const [least, most] = expectedVolumeL(material('gravel'), 80) ?? [NaN, NaN]
    expect(least).toBeCloseTo(47.06, 2)
    expect(most).toBeCloseTo(53.33, 2)
  })
})
