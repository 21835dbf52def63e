import { describe, expect, it } from 'vitest'

import { findListableTaxa, whyNotListed } from './find-listable-taxa'

const idsFor = (typed: string) => findListableTaxa(typed).map((taxon) => taxon.id)

describe('picking a species', () => {
  it('finds by common, scientific and trade name', () => {
    expect(idsFor('blueg')[0]).toBe('bluegill')
    expect(idsFor('Oreochromis nil')[0]).toBe('nile_tilapia')
    expect(idsFor('shellcracker')).toContain('redear_sunfish')
    expect(idsFor('talapia').length).toBeGreaterThanOrEqual(1)
  })

  it('puts names that begin with the word first', () => {
    expect(idsFor('yellow perch')[0]).toBe('yellow_perch')
    expect(idsFor('perch')).toContain('yellow_perch')
  })

  it('never offers a blocked species, a worm, a plant, a family or a genus', () => {
    for (const typed of [
      'snakehead',
      'walking catfish',
      'silver carp',
      'zander',
      'red wiggler',
      'hydrilla',
      'Salmonidae',
    ])
      expect(idsFor(typed), typed).toEqual([])
  })

  it('says when a name is one we list for nobody', () => {
    expect(whyNotListed('zander')).toContain('We do not list this species')
    expect(whyNotListed('moon fish')).toContain('Not in our list yet')
  })
})
