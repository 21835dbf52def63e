import { describe, expect, it } from 'vitest'

import { soldAs, unitCount, unitNoun } from '@/shared/domain/listings/unit-words'
import { gramsPerOunce } from '@/shared/units/mass'

const eightOunces = { kind: 'weight', netG: 8 * gramsPerOunce } as const

describe('words for what is counted', () => {
  it.each([
    [{ kind: 'head' }, 3, '3 heads'],
    [{ kind: 'head' }, 1, '1 head'],
    [{ kind: 'each' }, 1200, '1,200 pieces'],
    [{ kind: 'bunch' }, 2, '2 bunches'],
    [{ kind: 'bunch', netG: 6 * gramsPerOunce }, 1, '1 bunch of 6 oz (170 g)'],
    [{ kind: 'dry-pint' }, 4, '4 dry pints'],
    [eightOunces, 2, '2 packs of 8 oz (227 g)'],
    [{ kind: 'pack', count: 250 }, 1, '1 pack of 250 worms'],
    [{ kind: 'volume', litres: 50, weightKg: 14 }, 2, '2 bags of 50 L (1.8 cu ft)'],
  ] as const)('counts %j, %i times', (unit, count, words) => expect(unitCount(unit, count)).toBe(words))

  it.each([
    [{ kind: 'head' }, 'By the head'],
    [{ kind: 'each' }, 'By the piece'],
    [{ kind: 'bunch' }, 'By the bunch'],
    [eightOunces, 'Packs of 8 oz (227 g)'],
    [{ kind: 'volume', litres: 50, weightKg: 14 }, 'Bags of 50 L (1.8 cu ft)'],
  ] as const)('says how %j is sold', (unit, words) => expect(soldAs(unit)).toBe(words))

  it('calls larvae larvae', () => {
    expect(unitCount({ kind: 'pack', count: 1000 }, 2, 'larvae')).toBe('2 packs of 1,000 larvae')
    expect(soldAs({ kind: 'pack', count: 1000 }, 'larvae')).toBe('Packs of 1,000 larvae')
  })

  it('never says how much with the container alone', () => {
    for (const kind of ['weight', 'pack', 'volume'] as const) expect(unitNoun({ kind }, 2)).not.toBe('')
    expect(unitCount(eightOunces, 1)).not.toBe('1 pack')
  })
})
