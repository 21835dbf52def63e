import { describe, expect, it } from 'vitest'

import { claimWindowHours, promiseOf } from '@/shared/domain/listings/claim-promise'
import { countWords, thingsOf, unitWordOf } from '@/shared/domain/listings/count-words'
import { gateOf } from '@/shared/domain/listings/gated-lot'
import { heldWords } from '@/shared/domain/listings/held-words'
import { printLotPrice } from '@/shared/domain/listings/lot-price'
import { lotSize } from '@/shared/domain/listings/lot-size'
import { lotTitle, type NamedLot } from '@/shared/domain/listings/lot-title'

describe('what a listing of each category is called', () => {
  it.each<[NamedLot, string]>([
    [{ category: 'fish', taxonId: 'nile_tilapia', stage: 'fingerling' }, 'Nile tilapia fingerlings'],
    [{ category: 'worms', taxonId: 'red_wiggler', strain: 'our bin' }, 'Red wiggler (our bin)'],
    [{ category: 'media', material: 'expanded_clay', used: 'used' }, 'Expanded clay, used'],
    [{ category: 'media', material: 'other', materialWords: 'Crushed brick', used: 'new' }, 'Crushed brick'],
    [{ category: 'produce', cropId: 'kale', form: 'harvest-cut' }, 'Kale, cut leaves'],
  ])('%o is %s', (lot, title) => expect(lotTitle(lot)).toBe(title))
})

describe('how many of it', () => {
  const worms = { category: 'worms', taxonId: 'red_wiggler', saleUnit: { kind: 'pack', count: 250 } } as const
  const heads = { category: 'produce', saleUnit: { kind: 'head' } } as const
  it('is said in whole units', () => {
    expect(countWords({ category: 'fish' }, 1)).toBe('1 animal')
    expect(countWords({ category: 'fish' }, 1500)).toBe('1,500 animals')
    expect(countWords(heads, 1)).toBe('1 head')
    expect(countWords(heads, 3)).toBe('3 heads')
    expect(countWords(worms, 2)).toBe('2 × 250 worms')
    expect([thingsOf(worms), thingsOf(heads), unitWordOf(worms)]).toEqual(['worms', 'goods', 'pack'])
  })
  it('has a price that others can be held against, where a unit says how much is in it', () => {
    const lettuce = { category: 'produce', cropId: 'leaf_lettuce', saleUnit: { kind: 'head' } } as const
    expect(printLotPrice(lettuce, 300, 'us')).toEqual({ price: '$3.00 a head', comparable: null })
    expect(printLotPrice(worms, 1600, 'us').comparable).toBe('$6.40/100')
    expect(printLotPrice({ category: 'fish' }, 95, 'us')).toEqual({ price: '$0.95 each', comparable: null })
  })
})

describe('what is asked of it', () => {
  const promise = { windowHours: 24, survivalDays: 3, remedy: 'refund', evidence: 'A photo' } as const
  it('is a promise for animals, and the shortest window for everything else', () => {
    expect(claimWindowHours({ category: 'fish', promise })).toBe(24)
    expect(promiseOf({ category: 'media' })).toBeNull()
    expect(claimWindowHours({ category: 'produce' })).toBe(4)
  })
  it('is the gate for animals and for plants that are watched', () => {
    const licenceNumbers = 'Class A 1142'
    expect(gateOf({ category: 'fish', taxonId: 'bluegill', licenceNumbers }).isAnimal).toBe(true)
    expect(gateOf({ category: 'media' }).taxonId).toBeNull()
    expect(gateOf({ category: 'produce', cropId: 'kale', words: '' }).taxonId).toBeNull()
    expect(gateOf({ category: 'produce', cropId: 'water_spinach', words: '' }).taxonId).toBe('water_spinach')
  })
  it('is a length for animals that have one', () => {
    expect(lotSize({ category: 'fish', sizeLoMm: 50, sizeHiMm: 75 })).toEqual({ loMm: 50, hiMm: 75 })
    expect(lotSize({ category: 'worms' })).toBeNull()
  })
  it('is a moderator for some flags and for others not', () => {
    expect(heldWords('words-hold:fillets')).toMatch(/"fillets"/)
    expect(heldWords('weight-differs')).toBeNull()
    expect(heldWords('toString')).toBeNull()
  })
})
