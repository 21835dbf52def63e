import type { Range } from '@/shared/domain/species/species-record'
import type { SourceKey } from '@/shared/sources'

export interface MediaMaterial {
  id: string
  name: string
  /** Dry loose weight, kg/m³ (coir: damp, as sold). null: nobody says. */
  densityKgPerM3: Range | null
  /** Sold by grain size. */
  hasGrain: boolean
  /** May carry worms, eggs or weed seed: the heat question is asked. */
  mayCarryWorms: boolean
  sourceKeys: readonly SourceKey[]
}

// prettier-ignore
const rows = [
  { id: 'expanded_clay', name: 'Expanded clay', densityKgPerM3: [250, 500], hasGrain: true, mayCarryWorms: false, sourceKeys: ['clay-maker', 'clay-article'] },
  { id: 'expanded_shale', name: 'Expanded shale', densityKgPerM3: [650, 900], hasGrain: true, mayCarryWorms: false, sourceKeys: ['memory'] },
  { id: 'lava_rock', name: 'Lava rock', densityKgPerM3: [700, 950], hasGrain: true, mayCarryWorms: false, sourceKeys: ['memory'] },
  { id: 'pumice', name: 'Pumice', densityKgPerM3: [500, 700], hasGrain: true, mayCarryWorms: false, sourceKeys: ['memory'] },
  { id: 'gravel', name: 'Pea or river gravel', densityKgPerM3: [1500, 1700], hasGrain: true, mayCarryWorms: false, sourceKeys: ['memory'] },
  { id: 'perlite', name: 'Perlite', densityKgPerM3: [80, 130], hasGrain: true, mayCarryWorms: false, sourceKeys: ['perlite-page', 'memory'] },
  { id: 'vermiculite', name: 'Vermiculite', densityKgPerM3: [80, 130], hasGrain: true, mayCarryWorms: false, sourceKeys: ['memory'] },
  { id: 'coir', name: 'Coir', densityKgPerM3: [250, 400], hasGrain: false, mayCarryWorms: true, sourceKeys: ['memory'] },
  { id: 'worm_castings', name: 'Worm castings', densityKgPerM3: null, hasGrain: false, mayCarryWorms: true, sourceKeys: ['umn-jumping-worms', 'memory'] },
  { id: 'compost', name: 'Compost', densityKgPerM3: null, hasGrain: false, mayCarryWorms: true, sourceKeys: ['umn-jumping-worms', 'memory'] },
  { id: 'other', name: 'Something else', densityKgPerM3: null, hasGrain: false, mayCarryWorms: true, sourceKeys: ['memory'] },
] as const satisfies readonly MediaMaterial[]

export type MediaId = (typeof rows)[number]['id']

export const mediaMaterials: readonly (MediaMaterial & { id: MediaId })[] = rows
export const mediaIds = rows.map((row) => row.id)
