import type { RulerKind } from '@/seed/pictures/draw-ruler'
import type { TaxonId } from '@/shared/domain/species/taxa.facts'

export type VesselKind = 'viewing-box' | 'white-pan' | 'blue-tub' | 'grey-bucket' | 'black-tray' | 'net'
export type GroundKind = 'planks' | 'concrete' | 'grass' | 'gravel' | 'bench'

export interface PicturePlan {
  /** Also the file: assets/demo/<name>.webp. */
  name: string
  taxonId: TaxonId
  /** Total length of the animals beside the ruler, inches. */
  sizeIn: readonly [low: number, high: number]
  count: number
  vessel: VesselKind
  ground: GroundKind
  /** null: somebody forgot it, for the moderators to find. */
  ruler: RulerKind | null
}

// prettier-ignore
export const picturePlans: readonly PicturePlan[] = [
  { name: 'bluegill-box', taxonId: 'bluegill', sizeIn: [2, 3], count: 5, vessel: 'viewing-box', ground: 'bench', ruler: 'wood' },
  { name: 'bluegill-pan', taxonId: 'bluegill', sizeIn: [1.5, 2.5], count: 9, vessel: 'white-pan', ground: 'planks', ruler: 'steel' },
  { name: 'bluegill-bucket', taxonId: 'bluegill', sizeIn: [3, 4], count: 6, vessel: 'grey-bucket', ground: 'grass', ruler: 'wood' },
  { name: 'hybrid-bluegill-box', taxonId: 'hybrid_bluegill', sizeIn: [3, 4], count: 3, vessel: 'viewing-box', ground: 'planks', ruler: 'white' },
  { name: 'hybrid-bluegill-tub', taxonId: 'hybrid_bluegill', sizeIn: [2, 3], count: 8, vessel: 'blue-tub', ground: 'concrete', ruler: 'wood' },
  { name: 'yellow-perch-box', taxonId: 'yellow_perch', sizeIn: [3, 4], count: 4, vessel: 'viewing-box', ground: 'concrete', ruler: 'steel' },
  { name: 'yellow-perch-pan', taxonId: 'yellow_perch', sizeIn: [2, 3], count: 8, vessel: 'white-pan', ground: 'gravel', ruler: 'wood' },
  { name: 'yellow-perch-no-ruler', taxonId: 'yellow_perch', sizeIn: [3, 4], count: 3, vessel: 'viewing-box', ground: 'bench', ruler: null },
  { name: 'largemouth-box', taxonId: 'largemouth_bass', sizeIn: [3, 4], count: 3, vessel: 'viewing-box', ground: 'grass', ruler: 'white' },
  { name: 'largemouth-tray', taxonId: 'largemouth_bass', sizeIn: [2, 3], count: 8, vessel: 'black-tray', ground: 'concrete', ruler: 'white' },
  { name: 'channel-catfish-box', taxonId: 'channel_catfish', sizeIn: [4, 6], count: 3, vessel: 'viewing-box', ground: 'gravel', ruler: 'wood' },
  { name: 'channel-catfish-bucket', taxonId: 'channel_catfish', sizeIn: [3, 4], count: 7, vessel: 'grey-bucket', ground: 'planks', ruler: 'steel' },
  { name: 'nile-tilapia-box', taxonId: 'nile_tilapia', sizeIn: [1, 2], count: 7, vessel: 'viewing-box', ground: 'bench', ruler: 'steel' },
  { name: 'nile-tilapia-pan', taxonId: 'nile_tilapia', sizeIn: [1, 1.5], count: 16, vessel: 'white-pan', ground: 'concrete', ruler: 'wood' },
  { name: 'nile-tilapia-large', taxonId: 'nile_tilapia', sizeIn: [4, 5], count: 2, vessel: 'viewing-box', ground: 'planks', ruler: 'wood' },
  { name: 'blue-tilapia-box', taxonId: 'blue_tilapia', sizeIn: [2, 3], count: 4, vessel: 'viewing-box', ground: 'concrete', ruler: 'wood' },
  { name: 'blue-tilapia-tub', taxonId: 'blue_tilapia', sizeIn: [1, 2], count: 13, vessel: 'blue-tub', ground: 'planks', ruler: 'white' },
  { name: 'red-tilapia-box', taxonId: 'red_hybrid_tilapia', sizeIn: [1.5, 2.5], count: 6, vessel: 'viewing-box', ground: 'gravel', ruler: 'white' },
  { name: 'rainbow-trout-box', taxonId: 'rainbow_trout', sizeIn: [3, 5], count: 4, vessel: 'viewing-box', ground: 'concrete', ruler: 'steel' },
  { name: 'rainbow-trout-net', taxonId: 'rainbow_trout', sizeIn: [3, 4], count: 6, vessel: 'net', ground: 'grass', ruler: 'white' },
  { name: 'koi-bucket', taxonId: 'common_carp_koi', sizeIn: [3, 4], count: 5, vessel: 'grey-bucket', ground: 'gravel', ruler: 'wood' },
  { name: 'koi-tub', taxonId: 'common_carp_koi', sizeIn: [4, 6], count: 3, vessel: 'blue-tub', ground: 'planks', ruler: 'white' },
  { name: 'goldfish-pan', taxonId: 'goldfish', sizeIn: [2, 3], count: 8, vessel: 'white-pan', ground: 'planks', ruler: 'wood' },
  { name: 'goldfish-box', taxonId: 'goldfish', sizeIn: [2, 3], count: 5, vessel: 'viewing-box', ground: 'grass', ruler: 'steel' },
  { name: 'rosy-minnow-net', taxonId: 'fathead_minnow', sizeIn: [1.5, 2.5], count: 11, vessel: 'net', ground: 'concrete', ruler: 'wood' },
  { name: 'golden-shiner-box', taxonId: 'golden_shiner', sizeIn: [2, 4], count: 5, vessel: 'viewing-box', ground: 'planks', ruler: 'steel' },
  { name: 'hybrid-striper-box', taxonId: 'hybrid_striped_bass', sizeIn: [3, 4], count: 4, vessel: 'viewing-box', ground: 'bench', ruler: 'wood' },
  { name: 'redclaw-pan', taxonId: 'redclaw_crayfish', sizeIn: [1.5, 2.5], count: 5, vessel: 'white-pan', ground: 'gravel', ruler: 'steel' },
  { name: 'redclaw-tray', taxonId: 'redclaw_crayfish', sizeIn: [3, 4], count: 3, vessel: 'black-tray', ground: 'planks', ruler: 'white' },
  { name: 'prawn-tub', taxonId: 'freshwater_prawn', sizeIn: [1, 2], count: 7, vessel: 'blue-tub', ground: 'concrete', ruler: 'wood' },
]
