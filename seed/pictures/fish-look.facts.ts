import type { TaxonId } from '@/shared/domain/species/taxa.facts'

export type FishMark = 'bars' | 'saddles' | 'stripe' | 'lines' | 'spots' | 'band' | 'patches' | 'plain'

/** How an animal is drawn. Shares are of its length; looks are from memory and simplified to what tells kinds apart. */
export interface FishLook {
  build: 'deep' | 'long' | 'whiskered'
  above: number
  below: number
  tail: 'forked' | 'square' | 'flowing'
  /** Begin, end and height of each fin on the back. */
  backFins: readonly (readonly [number, number, number])[]
  isSpiny: boolean
  back: string
  flank: string
  belly: string
  fins: string
  mark: FishMark
  markColour: string
  /** Second colour of patches; the dark spot of sunfishes. */
  second?: string
}

const sunfishFins = [[0.28, 0.76, 0.1]] as const
const twoFins = [
  [0.3, 0.52, 0.11],
  [0.56, 0.74, 0.09],
] as const
const oneFin = [[0.42, 0.58, 0.12]] as const

// prettier-ignore
export const fishLooks: Partial<Record<TaxonId, FishLook>> = {
  bluegill: { build: 'deep', above: 0.225, below: 0.195, tail: 'square', backFins: sunfishFins, isSpiny: true, back: '#4f6257', flank: '#8ea394', belly: '#e09a45', fins: '#6d8073', mark: 'bars', markColour: '#647a6c', second: '#1d2735' },
  hybrid_bluegill: { build: 'deep', above: 0.215, below: 0.185, tail: 'square', backFins: sunfishFins, isSpiny: true, back: '#3f6150', flank: '#7fa283', belly: '#d8c56c', fins: '#c9a545', mark: 'bars', markColour: '#5b8468', second: '#1f2c2c' },
  yellow_perch: { build: 'long', above: 0.15, below: 0.13, tail: 'square', backFins: twoFins, isSpiny: true, back: '#77702f', flank: '#dcbb3e', belly: '#f5efd8', fins: '#df7d33', mark: 'saddles', markColour: '#4d4a26' },
  largemouth_bass: { build: 'long', above: 0.15, below: 0.14, tail: 'square', backFins: twoFins, isSpiny: true, back: '#48653d', flank: '#a3b67d', belly: '#f0f2e6', fins: '#71845a', mark: 'stripe', markColour: '#33472f' },
  channel_catfish: { build: 'whiskered', above: 0.115, below: 0.12, tail: 'forked', backFins: [[0.3, 0.39, 0.13], [0.68, 0.74, 0.045]], isSpiny: false, back: '#57636c', flank: '#95a4ab', belly: '#f1f3f1', fins: '#6c7981', mark: 'spots', markColour: '#3c474f' },
  nile_tilapia: { build: 'deep', above: 0.2, below: 0.175, tail: 'square', backFins: [[0.24, 0.8, 0.1]], isSpiny: true, back: '#545d5f', flank: '#9daaa9', belly: '#eceee9', fins: '#7d8888', mark: 'bars', markColour: '#76827f' },
  blue_tilapia: { build: 'deep', above: 0.2, below: 0.175, tail: 'square', backFins: [[0.24, 0.8, 0.1]], isSpiny: true, back: '#456579', flank: '#8db1c4', belly: '#e8eff2', fins: '#c58b84', mark: 'bars', markColour: '#7099ae' },
  red_hybrid_tilapia: { build: 'deep', above: 0.205, below: 0.18, tail: 'square', backFins: [[0.24, 0.8, 0.1]], isSpiny: true, back: '#df7d5d', flank: '#f1a98f', belly: '#fcebe2', fins: '#e59a7f', mark: 'plain', markColour: '#df7d5d' },
  rainbow_trout: { build: 'long', above: 0.115, below: 0.11, tail: 'square', backFins: [...oneFin, [0.72, 0.76, 0.04]], isSpiny: false, back: '#56766f', flank: '#c9d5d0', belly: '#f7f8f4', fins: '#8fa59c', mark: 'band', markColour: '#d9818f', second: '#37504b' },
  common_carp_koi: { build: 'long', above: 0.15, below: 0.14, tail: 'forked', backFins: [[0.32, 0.66, 0.1]], isSpiny: false, back: '#f7f3ea', flank: '#f7f3ea', belly: '#ffffff', fins: '#efe6d6', mark: 'patches', markColour: '#e4622c', second: '#23262b' },
  goldfish: { build: 'deep', above: 0.18, below: 0.17, tail: 'flowing', backFins: [[0.34, 0.64, 0.12]], isSpiny: false, back: '#e57a1d', flank: '#f3952f', belly: '#fbc070', fins: '#f3a654', mark: 'plain', markColour: '#ffffff' },
  fathead_minnow: { build: 'long', above: 0.12, below: 0.12, tail: 'forked', backFins: oneFin, isSpiny: false, back: '#d9775a', flank: '#efa083', belly: '#fbe3d6', fins: '#e7a78f', mark: 'stripe', markColour: '#c9694d' },
  golden_shiner: { build: 'deep', above: 0.15, below: 0.17, tail: 'forked', backFins: [[0.46, 0.6, 0.12]], isSpiny: false, back: '#8d8344', flank: '#e5cb72', belly: '#f8f2de', fins: '#c9a85c', mark: 'lines', markColour: '#c2a64f' },
  hybrid_striped_bass: { build: 'long', above: 0.155, below: 0.14, tail: 'forked', backFins: twoFins, isSpiny: true, back: '#56656f', flank: '#d2dade', belly: '#f8f9f7', fins: '#8e9ba2', mark: 'lines', markColour: '#3d4a53' },
}
