import { describe, expect, it } from 'vitest'
import { litresFromGallons, parseVolumeL, printDryVolume, printVolume } from '@/shared/units/volume'

describe('volumes', () => {
  it('reads gallons, litres, quarts and cubic feet', () => {
    expect(parseVolumeL('75 gal', 'metric')).toBeCloseTo(283.9058838, 6)
    expect(parseVolumeL('75', 'us')).toBeCloseTo(283.9058838, 6)
    expect(parseVolumeL('50 L', 'us')).toBe(50)
    expect(parseVolumeL('2 cu ft', 'us')).toBeCloseTo(56.633693184, 6)
    expect(parseVolumeL('4 qt', 'us')).toBeCloseTo(3.785411784, 9)
    expect(parseVolumeL('a tub', 'us')).toBeNull()
  })

  it('prints whole gallons for tanks and tenths for bags', () => {
    expect(printVolume(litresFromGallons(75), 'us')).toBe('75 gal')
    expect(printVolume(7.57, 'us')).toBe('2 gal')
    expect(printVolume(7.57, 'metric')).toBe('7.6 L')
    expect(printDryVolume(50, 'us')).toBe('1.8 cu ft')
    expect(printDryVolume(50, 'metric')).toBe('50 L')
  })
})
