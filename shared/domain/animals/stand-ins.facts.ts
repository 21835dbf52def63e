import type { SpeciesId } from '@/shared/domain/species/species.facts'

/** Species whose oxygen model was measured on another animal: which one. Whoever shows a figure from it says so. */
export const oxygenStandIns: Readonly<Partial<Record<SpeciesId, string>>> = {
  blue_tilapia: 'adult Nile tilapia',
  mozambique_hybrid_tilapia: 'adult Nile tilapia',
  nile_tilapia: 'adult tilapia',
  hybrid_bluegill: 'young bluegill',
  largemouth_bass: 'adult largemouth bass',
  channel_catfish: 'brown bullhead',
  rainbow_trout: 'adult rainbow trout',
  common_carp_koi: 'roach',
  goldfish: 'roach',
  golden_shiner: 'roach',
  hybrid_striped_bass: 'striped bass in their first year',
  redclaw_crayfish: 'rusty crayfish',
  red_swamp_crayfish: 'rusty crayfish',
}
