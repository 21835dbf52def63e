import { describe, expect, it } from 'vitest'

import { onlySpecies, speciesChoices, speciesName } from './species-choices'

const ids = (typed: string) => speciesChoices(typed).map(({ id }) => id)

describe('species to choose from while typing', () => {
  it('offers every tilapia for the group name, also misspelt', () => {
    expect(ids('tilapia')).toEqual(expect.arrayContaining(['nile_tilapia', 'blue_tilapia']))
    expect(ids('talapia')).toEqual(expect.arrayContaining(['nile_tilapia', 'blue_tilapia']))
    expect(ids('talapia')).not.toContain('bluegill')
  })

  it('takes scientific names and the beginnings of words', () => {
    expect(ids('Oreochromis niloticus')).toContain('nile_tilapia')
    expect(ids('perch')).toContain('yellow_perch')
  })

  it('offers nothing for a blank or an unknown name', () => {
    expect(ids('  ')).toEqual([])
    expect(ids('unicorn')).toEqual([])
  })

  it('knows when only one is meant', () => {
    expect(onlySpecies('yellow perch')?.id).toBe('yellow_perch')
    expect(onlySpecies('tilapia')).toBeUndefined()
  })

  it('names a species in English', () => {
    expect(speciesName('nile_tilapia')).toBe('Nile tilapia')
  })
})
