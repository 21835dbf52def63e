import { describe, expect, it } from 'vitest'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import { taxa } from '@/shared/domain/species/taxa.facts'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

describe('lineage of a taxon', () => {
  it('climbs from the species to the widest group', () => {
    expect(traceLineage('nile_tilapia')?.self).toEqual([
      'nile_tilapia',
      'oreochromis',
      'cichlidae',
      'fishes',
      'aquatic_animals',
    ])
  })

  it('climbs from both parents of a cross', () => {
    const lineage = traceLineage('hybrid_bluegill')
    expect(lineage?.self.slice(0, 2)).toEqual(['hybrid_bluegill', 'lepomis'])
    expect(lineage?.hybridParents.map((line) => line[0])).toEqual(['green_sunfish', 'bluegill'])
  })

  it('inherits the flags of its family', () => {
    expect(traceLineage('rainbow_trout')?.flags).toEqual(['salmonid-papers'])
    expect(traceLineage('bluegill')?.flags).toEqual([])
  })

  it('knows no lineage of a stranger', () => expect(traceLineage('axolotl')).toBeNull())

  it('has a taxon for each of the 20 species, under the same id', () => {
    for (const { id } of speciesFacts) expect(traceLineage(id)?.self[0]).toBe(id)
    const linked = new Set(taxa.flatMap((taxon) => taxon.speciesId ?? []))
    expect(linked.size).toBe(speciesFacts.length)
  })
})
