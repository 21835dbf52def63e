import type { TaxonId } from '@/shared/domain/species/taxa.facts'
import type { SourceKey } from '@/shared/sources'

export interface BlockedTaxon {
  /** The block covers everything below it and every cross with it. */
  taxonId: TaxonId
  why: string
  sourceKey: SourceKey
}

const injurious = 'On the federal list of injurious species.'
const weed = 'On the federal list of noxious weeds.'
const jumping = 'Jumping worms: prohibited in at least one state, and they spread in soil.'

// Platform policy for everyone: "we do not list this". Never worded as what a law says about shipping.
export const blockList: readonly BlockedTaxon[] = [
  { taxonId: 'clariidae', why: injurious, sourceKey: 'cfr-50-16-13' },
  { taxonId: 'channidae', why: injurious, sourceKey: 'cfr-50-16-13' },
  { taxonId: 'eriocheir', why: injurious, sourceKey: 'cfr-50-16-13' },
  { taxonId: 'dreissena', why: injurious, sourceKey: 'cfr-50-16-13' },
  { taxonId: 'silver_carp', why: injurious, sourceKey: 'fr-72-37459' },
  { taxonId: 'largescale_silver_carp', why: injurious, sourceKey: 'fr-72-37459' },
  { taxonId: 'crucian_carp', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'prussian_carp', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'eurasian_minnow', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'roach', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'stone_moroko', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'nile_perch', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'amur_sleeper', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'european_perch', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'zander', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'wels_catfish', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'common_yabby', why: injurious, sourceKey: 'fr-81-67862' },
  { taxonId: 'black_carp', why: 'Believed to be on the federal list; not checked.', sourceKey: 'memory' },
  { taxonId: 'bighead_carp', why: 'Believed to be on the federal list; not checked.', sourceKey: 'memory' },
  { taxonId: 'amynthas', why: jumping, sourceKey: 'mn-worms-2024' },
  { taxonId: 'metaphire', why: jumping, sourceKey: 'mn-worms-2024' },
  { taxonId: 'water_mosquito_fern', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'anchored_water_hyacinth', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'hydrilla', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'miramar_weed', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'african_elodea', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'asian_marshweed', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'monochoria', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'duck_lettuce', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'arrowhead', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'giant_salvinia', why: weed, sourceKey: 'plants-list-2000' },
  { taxonId: 'exotic_bur_reed', why: weed, sourceKey: 'plants-list-2000' },
]

export interface GuardedTaxon {
  taxonId: TaxonId
  why: string
  /** Asked before a hand-over inside one state. Across a state line we do not carry it at all. */
  papers: readonly string[]
  sourceKeys: readonly SourceKey[]
}

// Edible and a federal noxious weed at once; some states let people grow it under conditions.
export const guardedTaxa: readonly GuardedTaxon[] = [
  {
    taxonId: 'water_spinach',
    why: 'A food plant that is also on the federal list of noxious weeds: never across a state line, and inside a state only with a permit.',
    papers: ['State permit or licence to grow and sell water spinach'],
    sourceKeys: ['penn-state-weeds', 'plants-list-2000', 'chilton-jap'],
  },
]
