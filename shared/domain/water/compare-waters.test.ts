import { describe, expect, it } from 'vitest'

import { sources } from '@/shared/sources'
import { compareWaters, isWaterFigure, type Water } from '@/shared/domain/water/compare-waters'
import { waterMatch } from '@/shared/domain/water/water-match.facts'
import { celsiusFromF } from '@/shared/units/temperature'

const theirs: Water = { waterC: 20, pH: 7, khPpm: 100 }
const one = (yours: Partial<Water>, from: Water = theirs) => compareWaters(from, yours)[0]

describe('temperatures held against each other', () => {
  it.each([
    [0, 'match', null],
    [2, 'match', null],
    [2.01, 'float', 20],
    [5, 'float', 20],
    [5.01, 'slowly', 61],
    [7.5, 'slowly', 90],
    [10, 'slowly', 120],
    [10.01, 'too-far', null],
  ] as const)('%d °C apart: %s, %s min, up or down', (apart, verdict, minutes) => {
    expect(one({ waterC: 20 + apart })).toMatchObject({ verdict, minutes, difference: apart })
    expect(one({ waterC: 20 - apart })).toMatchObject({
      verdict,
      minutes,
      difference: apart === 0 ? 0 : -apart,
    })
  })

  it('reads 68 °F and 77 °F as 5 °C apart, whatever the last bits say', () => {
    const from = { ...theirs, waterC: celsiusFromF(68) }
    expect(one({ waterC: celsiusFromF(77) }, from)).toMatchObject({ verdict: 'float', difference: 5 })
  })

  it('names the published limit from 5 °F on, and the house rule alone below', () => {
    expect(one({ waterC: 22.8 })).toMatchObject({ sourceKey: 'house-rule', needSourceKey: null })
    expect(one({ waterC: 22.81 })).toMatchObject({ sourceKey: 'house-rule', needSourceKey: 'lsu-cocahoe' })
    expect(one({ pH: 9 })?.needSourceKey).toBeNull()
    // 5 °F is 2.78 °C: the limit is that figure to a tenth, and ours stands below it.
    expect(waterMatch.temperFromC.value).toBeCloseTo(5 / 1.8, 1)
    expect(waterMatch.releaseC.value).toBeLessThan(waterMatch.temperFromC.value)
  })

  it('never goes faster than the hatchery guide’s degree Fahrenheit a minute', () => {
    expect(waterMatch.ratePerHourC.value / 60).toBeLessThan(1 / 1.8)
  })
})

describe('pH held against each other', () => {
  it.each([
    [0.5, 'match', null],
    [0.51, 'slowly', 30],
    [0.6, 'slowly', 30],
    [0.61, 'slowly', 45],
    [1.5, 'slowly', 75],
    [1.51, 'too-far', null],
  ] as const)('%d apart: %s, %s min', (apart, verdict, minutes) => {
    expect(one({ pH: 7 + apart })).toMatchObject({ figure: 'pH', verdict, minutes })
    expect(one({ pH: 7 - apart })).toMatchObject({ figure: 'pH', verdict, minutes })
  })
})

describe('carbonate hardness held against each other', () => {
  it.each([
    [59.9, 'too-soft'],
    [60, 'match'],
    [200, 'match'],
    [200.1, 'slowly'],
  ] as const)('yours %d against 100: %s', (khPpm, verdict) => {
    expect(one({ khPpm })).toMatchObject({ figure: 'khPpm', verdict, minutes: null })
  })
})

describe('waters', () => {
  it('are compared figure by figure, without what is not given or cannot be', () => {
    expect(compareWaters(theirs, {})).toEqual([])
    expect(compareWaters(theirs, { waterC: 21, pH: 7.2, khPpm: 90 }).map((row) => row.figure)).toEqual([
      'waterC',
      'pH',
      'khPpm',
    ])
    expect(compareWaters(theirs, { waterC: 46, pH: 2.9, khPpm: 1001 })).toEqual([])
    expect(compareWaters(theirs, { waterC: NaN, pH: Infinity })).toEqual([])
    for (const [figure, least, most] of [
      ['waterC', 0, 45],
      ['pH', 3, 11],
      ['khPpm', 0, 1000],
    ] as const) {
      expect([least, most].every((edge) => isWaterFigure(figure, edge))).toBe(true)
      expect([least - 0.1, most + 0.1].some((beyond) => isWaterFigure(figure, beyond))).toBe(false)
    }
  })

  it('rest on limits that each have a source', () => {
    for (const { sourceKey } of Object.values(waterMatch)) expect(sources).toHaveProperty(sourceKey)
    const all = compareWaters(theirs, { waterC: 26, pH: 8, khPpm: 40 })
    expect(all.map(({ sourceKey }) => Object.hasOwn(sources, sourceKey))).toEqual([true, true, true])
  })
})
