import { describe, expect, it } from 'vitest'

import { animalWord } from './animal-words'

import { speciesFacts } from '@/shared/domain/species/species.facts'

describe('the word for what a buyer counts', () => {
  it('tells fish from crustaceans for every species with care figures', () => {
    const inWater = speciesFacts.filter(({ kind }) => kind === 'fish' || kind === 'crustacean')
    expect(inWater.length).toBeGreaterThan(10)
    for (const { id, kind } of inWater)
      expect([id, animalWord(id, 2) === 'fish']).toEqual([id, kind === 'fish'])
  })

  it('counts one prawn and several prawns', () => {
    expect([animalWord('freshwater_prawn', 1), animalWord('freshwater_prawn', 20)]).toEqual([
      'prawn',
      'prawns',
    ])
  })
})
