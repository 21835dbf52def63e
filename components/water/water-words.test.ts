import { describe, expect, it } from 'vitest'

import {
  adviceWords,
  differenceWords,
  groundsWords,
  printFigure,
  readFigure,
  typedFigure,
} from './water-words'

import { compareWaters } from '@/shared/domain/water/compare-waters'

const theirs = { waterC: 20, pH: 7, khPpm: 100 }
const told = (yours: object) => {
  const [row] = compareWaters(theirs, yours)
  if (!row) throw new Error('nothing was compared')
  return {
    difference: differenceWords(row, 'us'),
    advice: adviceWords(row, 'us'),
    grounds: groundsWords(row),
  }
}

describe('two waters in words', () => {
  it('say the difference in both scales, and which way', () => {
    expect(told({ waterC: 25 }).difference).toBe('Yours is 9 °F (5 °C) warmer')
    expect(told({ waterC: 18 }).difference).toBe('Yours is 4 °F (2 °C) colder')
    expect(told({ waterC: 20 }).difference).toBe('The same')
    expect(told({ pH: 6.4 }).difference).toBe('Yours is 0.6 lower')
    expect(told({ khPpm: 1000 }).difference).toBe('Yours is 900 ppm higher')
  })

  it('say what to do, with times and limits that are the judgement’s own', () => {
    expect(told({ waterC: 21 }).advice).toBe('Nothing to do for this one.')
    expect(told({ waterC: 24 }).advice).toBe('Float the closed bag in your tank for 20 minutes.')
    expect(told({ waterC: 27.5 }).advice).toBe(
      'Take at least 1 h 30 min: no faster than 9 °F (5 °C) an hour.',
    )
    expect(told({ waterC: 31 }).advice).toMatch(/^More than 18 °F \(10 °C\)/)
    expect(told({ pH: 7.8 }).advice).toMatch(/^Take at least 45 minutes: 0.3 in 15 minutes/)
    expect(told({ pH: 9 }).advice).toMatch(/^Do not let them go/)
    expect(told({ khPpm: 40 }).advice).toMatch(/^Below 60 ppm/)
    expect(told({ khPpm: 400 }).advice).toMatch(/^Add a little/)
  })

  it('tell what is published from what is our own judgement', () => {
    expect(told({ waterC: 22 }).grounds).toBe('House rule: our own cautious judgement')
    expect(told({ waterC: 30 }).grounds).toMatch(/^That it matters: LSU AgCenter.* fast: House rule/)
    expect(told({ pH: 9 }).grounds).toMatch(/^House rule/)
  })

  it('read what is typed in the reader’s units, and nothing that is no water', () => {
    expect(readFigure('waterC', '77', 'us')).toBe(25)
    expect(readFigure('waterC', '25', 'metric')).toBe(25)
    expect(readFigure('waterC', '25 C', 'us')).toBe(25)
    expect(readFigure('waterC', '200', 'us')).toBeNull()
    expect(readFigure('pH', 'pH 7.2', 'us')).toBe(7.2)
    expect(readFigure('pH', '72', 'us')).toBeNull()
    expect(readFigure('khPpm', '6 dKH', 'us')).toBeCloseTo(107, 0)
    expect(readFigure('khPpm', 'soft', 'us')).toBeNull()
  })

  it('print what was kept so that it reads back the same', () => {
    expect(typedFigure('pH', undefined, 'us')).toBe('')
    for (const units of ['us', 'metric'] as const) {
      for (const [figure, value] of [
        ['waterC', 25],
        ['pH', 7.25],
        ['khPpm', 107],
      ] as const) {
        expect(readFigure(figure, typedFigure(figure, value, units), units)).toBeCloseTo(value, 6)
      }
    }
    expect(printFigure('waterC', 25, 'metric')).toBe('25 °C (77 °F)')
    expect(printFigure('khPpm', 1000, 'us')).toBe('1,000 ppm')
  })
})
