import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { findSpecies, findSpeciesByCode } from '@/shared/domain/species/find-species'
import { catfishTable } from '@/shared/domain/species/catfish-table.facts'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import type { Range } from '@/shared/domain/species/species-record'

interface PublishedRow {
  id: string
  extension_table_lb_per_1000?: Record<string, number>
  extension_table_per_lb?: Record<string, number>
  length_weight?: { K: number }
  standard_weight?: { a?: number; b?: number; min_tl_mm?: number }
  hardness_range_mg_l?: [number, number]
  [key: string]: unknown
}

const published = (
  JSON.parse(readFileSync('assets/data/species.json', 'utf8')) as { species: PublishedRow[] }
).species

const samePlace: [string, keyof (typeof speciesFacts)[number]][] = [
  ['common_name', 'commonName'],
  ['scientific_name', 'scientificName'],
  ['kind', 'kind'],
  ['thermal_class', 'thermalClass'],
  ['temp_opt_c', 'optimumC'],
  ['temp_feed_c', 'feedC'],
  ['temp_stress_c', 'stressC'],
  ['temp_lethal_c', 'lethalC'],
  ['ship_water_c', 'shipWaterC'],
  ['ship_air_c', 'shipAirC'],
  ['do_good_mg_l', 'goodOxygenMgPerL'],
  ['do_min_mg_l', 'leastOxygenMgPerL'],
  ['do_survives_mg_l', 'survivesOxygenMgPerL'],
  ['ph', 'pH'],
  ['uia_n_chronic_mg_l', 'uiaChronicMgPerL'],
  ['uia_acute_kill_mg_l', 'uiaKillMgPerL'],
  ['tan_max_mg_l', 'tanMostMgPerL'],
  ['nitrite_max_mg_l', 'nitriteMostMgPerL'],
  ['chloride_to_nitrite_min', 'chlorideToNitriteLeast'],
  ['salinity_ppt_max', 'saltMostPpt'],
  ['market_size_g', 'marketG'],
  ['tgc_x1000', 'tgcX1000'],
  ['fingerling_months', 'fingerlingMonths'],
  ['spawn_temp_min_c', 'spawnLeastC'],
  ['spawn_temp_best_c', 'spawnBestC'],
  ['hatch_degree_days_c', 'hatchDegreeDaysC'],
  ['size_ratio_max', 'sizeRatioMost'],
  ['fasting_h', 'fastHours'],
  ['count_per_lb', 'countPerLb'],
  ['count_per_lb_nominal', 'countPerLbUsual'],
]

describe('species facts', () => {
  it('holds the same 20 animals, in the same order, as the published data file', () => {
    expect(speciesFacts.map((species) => species.id)).toEqual(published.map((row) => row.id))
    expect(speciesFacts).toHaveLength(20)
  })

  it.each(published)('says of $id what the published data file says', (row) => {
    const species = findSpecies(row.id)
    for (const [theirs, ours] of samePlace) expect(species?.[ours], ours).toEqual(row[theirs] ?? null)
    expect(species?.lengthWeight?.fultonK ?? null).toBe(row.length_weight?.K ?? null)
    if (row.standard_weight?.a !== undefined) {
      const { a, b, min_tl_mm } = row.standard_weight
      expect(species?.standardWeight).toMatchObject({ a, b, leastMm: min_tl_mm })
    }
  })

  it('keeps ranges in order and each inside the wider one', () => {
    for (const { id, optimumC, feedC, stressC, lethalC, shipWaterC, shipAirC } of speciesFacts) {
      const inside = (narrow: Range, wide: Range) => wide[0] <= narrow[0] && narrow[1] <= wide[1]
      expect([id, optimumC[0] < optimumC[1]]).toEqual([id, true])
      expect([id, inside(optimumC, feedC), inside(stressC, lethalC)]).toEqual([id, true, true])
      expect([id, shipWaterC !== null || shipAirC !== null]).toEqual([id, true])
      if (shipWaterC) expect([id, inside(shipWaterC, lethalC)]).toEqual([id, true])
    }
  })

  it('numbers species 1 to 20 and finds them both ways', () => {
    expect(speciesFacts.map((species) => species.speciesCode)).toEqual(published.map((_, at) => at + 1))
    expect(findSpeciesByCode(1)?.id).toBe('nile_tilapia')
    expect(findSpeciesByCode(99)).toBeNull()
    expect(findSpecies('axolotl')).toBeNull()
  })

  it('copies the extension table of channel catfish whole', () => {
    const row = published.find(({ id }) => id === 'channel_catfish')
    const byInch = (pick: (one: (typeof catfishTable)[number]) => number) =>
      Object.fromEntries(catfishTable.map((one) => [String(one.inches), pick(one)]))
    expect(byInch((one) => one.lbPer1000)).toEqual(row?.extension_table_lb_per_1000)
    expect(byInch((one) => one.fishPerLb)).toEqual(row?.extension_table_per_lb)
  })
})
