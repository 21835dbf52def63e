import type { MediaBody } from '@/shared/contracts/media-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'

type Stock = Pick<ProduceBody, 'countOnHand' | 'tiers' | 'words'>

interface Told<Body, Field extends keyof Body> {
  key: string
  farm: string
  picture: string
  caption: string
  says: Stock & Pick<Body, Field>
}

const at = (unitCents: number) => [{ fromCount: 1, unitCents }]

/** A harvest of tomorrow morning; prices lie within the ranges of the trade notes. */
export const harvestLots: readonly Told<
  ProduceBody,
  'cropId' | 'form' | 'saleUnit' | 'growing' | 'accept' | 'variety'
>[] = [
  {
    ...{ key: 'lettuce', farm: 'greens', picture: 'goods-lettuce', caption: 'Tuesday’s raft' },
    says: {
      ...{ cropId: 'leaf_lettuce', variety: 'Salanova', form: 'whole', saleUnit: { kind: 'head' } },
      ...{ accept: 'instant', countOnHand: 14, tiers: at(300) },
      growing: 'On floating rafts, goldfish feed the roots. No synthetic pesticides.',
      words: 'Cut the same morning, roots off. Tell me if you want them with roots: they keep longer.',
    },
  },
  {
    ...{ key: 'basil', farm: 'greens', picture: 'goods-basil', caption: 'Before the cut' },
    says: {
      ...{ cropId: 'basil', variety: 'Genovese', form: 'whole', saleUnit: { kind: 'bunch', netG: 57 } },
      ...{ accept: 'ask', countOnHand: 10, tiers: at(350) },
      growing: 'In the warm bed by the window wall.',
      words: 'Never in the fridge, it goes black. A glass of water on the table does it.',
    },
  },
  {
    ...{ key: 'kale', farm: 'banklick', picture: 'goods-kale', caption: 'The back bed' },
    says: {
      ...{ cropId: 'kale', variety: undefined, form: 'whole', saleUnit: { kind: 'bunch', netG: 340 } },
      ...{ accept: 'instant', countOnHand: 18, tiers: at(375) },
      growing: 'Gravel bed, tilapia water below the roots.',
      words: 'A good pound less the stems. Bring your own bag.',
    },
  },
  {
    ...{ key: 'tomatoes', farm: 'southgate', picture: 'goods-tomato', caption: 'This week’s pick' },
    says: {
      ...{ cropId: 'tomato', variety: undefined, form: 'whole', saleUnit: { kind: 'weight', netG: 454 } },
      ...{ accept: 'instant', countOnHand: 22, tiers: at(450) },
      growing: 'Under lights in the class greenhouse.',
      words: 'Some are split from the warm night; those we eat ourselves.',
    },
  },
]

export const wormLots: readonly Told<WormBody, 'taxonId' | 'saleUnit' | 'countMethod' | 'bedding'>[] = [
  {
    ...{ key: 'wigglers', farm: 'greens', picture: 'goods-worms', caption: 'From the big bin' },
    says: {
      ...{ taxonId: 'red_wiggler', saleUnit: { kind: 'weight', netG: 227 }, countMethod: undefined },
      ...{ bedding: 'Damp coir and leaf mould', countOnHand: 12, tiers: at(1900) },
      words: 'Mixed sizes with cocoons, as they come out of the bin. Half a pound starts a small bed.',
    },
  },
  {
    ...{
      key: 'nightcrawlers',
      farm: 'quarryside',
      picture: 'goods-worms',
      caption: 'Sorted by the students',
    },
    says: {
      ...{ taxonId: 'european_nightcrawler', saleUnit: { kind: 'pack', count: 100 } },
      ...{ countMethod: 'hand', bedding: 'Damp peat', countOnHand: 30, tiers: at(1400) },
      words: 'Large ones, counted by hand by our students.',
    },
  },
]

export const mediaLots: readonly Told<
  MediaBody,
  | 'material'
  | 'saleUnit'
  | 'grainLoMm'
  | 'grainHiMm'
  | 'rinsed'
  | 'vinegarTest'
  | 'used'
  | 'usedWords'
  | 'heatTreated'
>[] = [
  {
    ...{ key: 'clay', farm: 'gearworks', picture: 'goods-clay', caption: 'Rinsed twice' },
    says: {
      ...{ material: 'expanded_clay', saleUnit: { kind: 'volume', litres: 50, weightKg: 19 } },
      ...{ grainLoMm: 8, grainHiMm: 16, rinsed: true, vinegarTest: 'no-fizz', heatTreated: undefined },
      ...{ used: 'used', usedWords: 'Two years in a tilapia bed, never any salt or medicine.' },
      ...{ countOnHand: 9, tiers: at(3200) },
      words: 'From the bed I took down. Bags are my own; bring one back and I take a dollar off next time.',
    },
  },
  {
    ...{ key: 'castings', farm: 'tollgate', picture: 'goods-castings', caption: 'Sieved' },
    says: {
      ...{ material: 'worm_castings', saleUnit: { kind: 'weight', netG: 4536 }, heatTreated: 'no' },
      ...{ grainLoMm: undefined, grainHiMm: undefined, rinsed: undefined, vinegarTest: undefined },
      ...{ used: 'new', usedWords: undefined, countOnHand: 25, tiers: at(1100) },
      words: 'Ten pounds a bag, sieved. Alive, so not heated: a worm or two may come along.',
    },
  },
]
