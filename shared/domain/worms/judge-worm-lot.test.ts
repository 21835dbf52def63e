import { describe, expect, it } from 'vitest'

import { judgeWormLot } from '@/shared/domain/worms/judge-worm-lot'
import { aliases } from '@/shared/domain/species/aliases.facts'
import { findTaxon } from '@/shared/domain/species/find-taxon'

const lot = { taxonId: 'red_wiggler', names: '', words: '', raisedInUs: true, lotChecked: true }
const codes = (change: Partial<typeof lot>) =>
  judgeWormLot({ ...lot, ...change }).reasons.map((one) => one.code)
const effect = (change: Partial<typeof lot>) => judgeWormLot({ ...lot, ...change }).effect

const jumping = ['amynthas', 'metaphire'] as const
const names = [
  ...aliases.filter((row) => jumping.some((id) => id === row.taxonId)).map((row) => row.alias),
  ...jumping.flatMap((id) => [findTaxon(id)?.scientificName ?? '', findTaxon(id)?.commonName ?? '']),
]

describe('a lot of worms', () => {
  it('passes when it is checked, home-raised and a worm we list', () => {
    for (const taxonId of [
      'red_wiggler',
      'european_nightcrawler',
      'canadian_nightcrawler',
      'black_soldier_fly_larvae',
    ])
      expect(judgeWormLot({ ...lot, taxonId })).toEqual({ effect: 'fine', reasons: [] })
  })

  it.each(jumping)('refuses the genus %s', (taxonId) => expect(codes({ taxonId })).toEqual(['blocked']))

  it('has names to try', () => expect(names.length).toBeGreaterThanOrEqual(10))
  it.each(names)('refuses "%s" as a name, in any case, and has it read in free words', (name) => {
    expect(codes({ names: `${name.toUpperCase()}, bed run` })).toEqual(['blocked'])
    expect(effect({ words: `Looked for ${name} and found none.` })).toBe('review')
  })

  it.each(['bluegill', 'water_spinach', 'earthworms', 'no-such-thing'])('takes %s for no worm', (taxonId) =>
    expect(codes({ taxonId })).toEqual(['not-a-worm']),
  )

  it('refuses a lot nobody looked through, and sends worms from abroad to review', () => {
    expect([effect({ lotChecked: false }), codes({ lotChecked: false })]).toEqual(['refuse', ['not-checked']])
    expect([effect({ raisedInUs: false }), codes({ raisedInUs: false })]).toEqual([
      'review',
      ['not-raised-in-us'],
    ])
  })
})
