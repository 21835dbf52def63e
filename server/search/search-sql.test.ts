import { describe, expect, it } from 'vitest'

import { firstDaySql, rangesSql, whole, wishSql } from '@/server/search/search-sql'
import type { SearchQuery } from '@/server/search/search-query'

const bare: SearchQuery = { origin: { lat: 39.125, lng: -84.525 }, radiusKm: 80, sort: 'nearest', limit: 24 }

describe('the text of a search', () => {
  it.each([1.5, NaN, Infinity, 2 ** 53])(
    'lets %d through to the database under no circumstances',
    (value) => {
      expect(() => whole(value)).toThrow(RangeError)
    },
  )

  it('takes no words: a number that is text at run time is refused', () => {
    const forged = { ...bare, count: '1 OR TRUE' as unknown as number }
    expect(() => wishSql(forged)).toThrow(RangeError)
  })

  it('tests nothing that was not asked', () => expect(wishSql(bare)).toEqual([]))

  it('finds nothing when neither pickup nor any lane will do', () => {
    expect(wishSql({ ...bare, handover: { pickup: false, lanes: [] } })).toEqual(['FALSE'])
  })

  it('finds nothing when no lane is safe or the state is not one of ours', () => {
    expect(wishSql({ ...bare, shipped: { lanes: [], state: 'AK' } })).toEqual(['FALSE'])
    expect(wishSql({ ...bare, shipped: { lanes: [3], state: 'PR' } })).toEqual(['FALSE'])
    expect(wishSql({ ...bare, shipped: { lanes: [3, 9], state: 'AK' } })).toEqual([
      '(ship_states&2)<>0',
      'lane IN (3,9)',
    ])
  })

  it('finds nothing in no ranges', () => expect(rangesSql('hil', [])).toBe('FALSE'))

  it('shows everything to a buyer from nowhere we know', () => {
    expect(wishSql({ ...bare, buyerState: 'PR' })).toEqual([])
    expect(wishSql({ ...bare, buyerState: 'AK' })).toEqual(['(hidden_states&2)=0'])
  })

  it('asks for the first day itself when no day was asked', () => expect(firstDaySql(bare)).toBe('next_day'))
})
