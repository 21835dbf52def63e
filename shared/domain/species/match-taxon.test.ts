import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { aliases } from '@/shared/domain/species/aliases.facts'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { bindNamebook, matchTaxon, scanForTaxa } from '@/shared/domain/species/match-taxon'
import { abbreviateGenus, normaliseName } from '@/shared/domain/species/normalise-name'
import { taxa } from '@/shared/domain/species/taxa.facts'

describe('one form for a name', () => {
  it.each([
    ['Nile Tilapias', 'nile tilapia'],
    ['  blue-gill ', 'blue gill'],
    ['Ràu Muống', 'rau muong'],
    ["parrot's feather", 'parrot feather'],
    ['yabbies', 'yabby'],
    ['Largemouth Bass', 'largemouth bass'],
    ['Lepomis cyanellus × L. macrochirus', 'lepomi cyanellu x l macrochiru'],
    ['!!', ''],
  ])('%j becomes %j', (typed, form) => expect(normaliseName(typed)).toBe(form))

  it('answers in trimmed lower case, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 30 }), (typed) => {
        const once = normaliseName(typed)
        expect(once).toBe(once.trim())
        expect(/[A-Z]/.test(once)).toBe(false)
      }),
    )
  })

  it('shortens the genus', () => {
    expect(abbreviateGenus('oreochromi niloticu')).toBe('o niloticu')
    expect(abbreviateGenus('tilapia')).toBe('')
  })
})

describe('matching a typed name', () => {
  it.each([
    ['Oreochromis niloticus', 'nile_tilapia', 'scientific'],
    ['O. niloticus', 'nile_tilapia', 'abbreviated'],
    ['Tilapia nilotica', 'nile_tilapia', 'synonym'],
    ['nile tilapia', 'nile_tilapia', 'accepted'],
    ['talapia', 'oreochromis', 'misspelt'],
    ['Indian murrels', 'striped_snakehead', 'trade'],
    ['Alabama jumpers', 'amynthas', 'trade'],
    ['Kangkong', 'water_spinach', 'foreign'],
    ['European perch', 'european_perch', 'accepted'],
    ['yellow perch', 'yellow_perch', 'accepted'],
    ['Clarias', 'walking_catfish', 'common'],
    ['Lepomis cyanellus x Lepomis macrochirus', 'hybrid_bluegill', 'scientific'],
  ])('%s is %s (%s)', (typed, taxonId, how) => expect(matchTaxon(typed)).toEqual({ taxonId, how }))

  it.each(['', 'perch', 'axolotl', 'constructor', '???'])('leaves %j to a moderator', (typed) =>
    expect(matchTaxon(typed)).toBeNull(),
  )

  it('keeps look-alikes apart', () => {
    const pairs = [
      ['yellow perch', 'European perch'],
      ['walleye', 'zander'],
      ['channel catfish', 'walking catfish'],
      ['redclaw', 'yabby'],
      ['goldfish', 'Prussian carp'],
    ] as const
    for (const [one, other] of pairs) expect(matchTaxon(one)?.taxonId).not.toBe(matchTaxon(other)?.taxonId)
  })

  it('lets no alias take a scientific name away', () => {
    const book = bindNamebook(taxa, [{ alias: 'Channa argus', taxonId: 'bluegill', kind: 'trade' }])
    expect(matchTaxon('channa argus', book)).toEqual({ taxonId: 'northern_snakehead', how: 'scientific' })
  })

  it('finds names inside a text, the longest first', () => {
    const ids = (text: string) => scanForTaxa(text).map((match) => match.taxonId)
    expect(ids('Fresh kang kong, also red worms in the bedding')).toEqual(['water_spinach', 'red_wiggler'])
    expect(ids('Hybrid bluegill 2-3 in')).toEqual(['hybrid_bluegill'])
    expect(ids('Crisp lettuce, two heads')).toEqual([])
  })
})

describe('taxa and aliases', () => {
  it('gives every id, scientific name and shortened name to one taxon only', () => {
    const unique = (names: string[]) => expect([...new Set(names)]).toEqual(names)
    unique(taxa.map((taxon) => taxon.id))
    unique(taxa.map((taxon) => normaliseName(taxon.scientificName)))
    unique(
      taxa.filter((t) => t.rank === 'species').map((t) => abbreviateGenus(normaliseName(t.scientificName))),
    )
  })

  it('gives no alias to two taxa', () => {
    const owner = new Map<string, string>()
    for (const { alias, taxonId } of aliases) {
      const form = normaliseName(alias)
      expect([alias, owner.get(form) ?? taxonId]).toEqual([alias, taxonId])
      owner.set(form, taxonId)
    }
  })

  it('matches every alias to its own taxon', () => {
    for (const { alias, taxonId } of aliases)
      expect([alias, matchTaxon(alias)?.taxonId]).toEqual([alias, taxonId])
  })

  it('names parents that exist, without a circle, and both parents of each cross', () => {
    for (const taxon of taxa) {
      if (taxon.parentId !== null) expect(findTaxon(taxon.parentId)).not.toBeNull()
      expect(taxon.rank === 'hybrid').toBe(taxon.hybridParents !== null)
      for (const parent of taxon.hybridParents ?? []) expect(findTaxon(parent)?.rank).toBe('species')
    }
  })
})
