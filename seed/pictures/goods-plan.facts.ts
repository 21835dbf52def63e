import type { GroundKind, VesselKind } from '@/seed/pictures/picture-plan.facts'

export type GoodsLook = 'head' | 'leaf' | 'pellet' | 'crumb' | 'worm' | 'fruit'

export interface GoodsPlan {
  /** Also the file: assets/demo/<name>.webp. */
  name: string
  look: GoodsLook
  colours: readonly string[]
  /** Length of one piece, px. */
  piecePx: number
  count: number
  vessel: VesselKind
  ground: GroundKind
}

// prettier-ignore
export const goodsPlans: readonly GoodsPlan[] = [
  { name: 'goods-lettuce', look: 'head', colours: ['#8cbf4f', '#7fb044', '#9acb5e'], piecePx: 190, count: 16, vessel: 'black-tray', ground: 'bench' },
  { name: 'goods-basil', look: 'leaf', colours: ['#3f8f45', '#4c9e4e', '#347f3d'], piecePx: 110, count: 130, vessel: 'white-pan', ground: 'planks' },
  { name: 'goods-kale', look: 'leaf', colours: ['#3c6e57', '#47805f', '#2f5f4d'], piecePx: 190, count: 70, vessel: 'grey-bucket', ground: 'concrete' },
  { name: 'goods-tomato', look: 'fruit', colours: ['#c8402f', '#d4503a', '#b93527'], piecePx: 96, count: 60, vessel: 'blue-tub', ground: 'planks' },
  { name: 'goods-worms', look: 'worm', colours: ['#9c4f45', '#87413b', '#ae6053'], piecePx: 120, count: 90, vessel: 'black-tray', ground: 'bench' },
  { name: 'goods-clay', look: 'pellet', colours: ['#a4552f', '#934a28', '#b56439', '#7f4023'], piecePx: 46, count: 520, vessel: 'grey-bucket', ground: 'concrete' },
  { name: 'goods-castings', look: 'crumb', colours: ['#3b2d22', '#483829', '#2f241b'], piecePx: 26, count: 900, vessel: 'white-pan', ground: 'gravel' },
]
