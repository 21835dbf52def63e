import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  cmFromQuarterInches,
  parseLengthCm,
  parseLengthRangeCm,
  printLength,
  printLengthRange,
  quarterInchesFromCm,
} from '@/shared/units/length'

describe('lengths', () => {
  it('reads inches, centimetres and millimetres', () => {
    expect(parseLengthCm('2 1/4 in', 'us')).toBeCloseTo(5.715, 6)
    expect(parseLengthCm('6 cm', 'us')).toBe(6)
    expect(parseLengthCm('60 mm', 'us')).toBeCloseTo(6, 6)
    expect(parseLengthCm('3"', 'metric')).toBeCloseTo(7.62, 6)
  })

  it('reads a bare number in the units of the member', () => {
    expect(parseLengthCm('2', 'us')).toBeCloseTo(5.08, 6)
    expect(parseLengthCm('2', 'metric')).toBe(2)
  })

  it.each(['3-4in', '3 - 4 in', '3 to 4 in', '3in–4in', '3"-4"'])('reads the range %s', (typed) => {
    expect(parseLengthRangeCm(typed, 'metric')).toEqual({ minCm: 3 * 2.54, maxCm: 4 * 2.54 })
  })

  it('reads mixed numbers inside a range and a single length as a range of none', () => {
    expect(parseLengthRangeCm('1-1/2-2 1/4 in', 'us')).toEqual({ minCm: 1.5 * 2.54, maxCm: 2.25 * 2.54 })
    expect(parseLengthRangeCm('6 cm', 'us')).toEqual({ minCm: 6, maxCm: 6 })
  })

  it.each(['4-3 in', 'long', '3-', '-', '3 stone', '3 constructor'])('does not read %j', (typed) => {
    expect(parseLengthRangeCm(typed, 'us')).toBeNull()
  })

  it('prints quarter inches and half centimetres', () => {
    expect(printLength(5.715, 'us')).toBe('2¼ in')
    expect(printLength(0.6, 'us')).toBe('¼ in')
    expect(printLength(2.54, 'us')).toBe('1 in')
    expect(printLength(5.715, 'metric')).toBe('5.5 cm')
    expect(printLengthRange({ minCm: 7.62, maxCm: 10.16 }, 'us')).toBe('3–4 in')
    expect(printLengthRange({ minCm: 7.62, maxCm: 7.62 }, 'us')).toBe('3 in')
  })

  it('keeps a quarter-inch grade through centimetres and through its own print', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 200 }), (quarters) => {
        const cm = cmFromQuarterInches(quarters)
        expect(quarterInchesFromCm(cm)).toBe(quarters)
        expect(quarterInchesFromCm(parseLengthCm(printLength(cm, 'us'), 'us') ?? 0)).toBe(quarters)
      }),
    )
  })
})
