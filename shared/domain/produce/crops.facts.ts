import type { Crop, CropGroup, KeepingTime } from '@/shared/domain/produce/crop'
import type { SaleUnitKind } from '@/shared/domain/listings/sale-unit'
import type { Range } from '@/shared/domain/species/species-record'
import type { SourceKey } from '@/shared/sources'

/** Chart of one state and the handbook behind it; crops the chart does not name follow their neighbours, from memory. */
export const methodOfSaleSources: readonly SourceKey[] = ['state-produce-units', 'nist-hb-130', 'memory']

/** Which greens count once they are cut; that herbs are left out is from memory. */
export const cutLeafyGreensSources: readonly SourceKey[] = ['food-code-2009', 'memory']

const freezing = -0.5

/** A published life near 0 °C holds up to 2 °C. House rule: up to 5 °C (41 °F, a good fridge) half of its short end. */
const nearFreezing = (days: Range, sourceKey: SourceKey): KeepingTime[] => [
  { fromC: freezing, toC: 2, days, sourceKey },
  { fromC: 2, toC: 5, days: [Math.floor(days[0] / 2), Math.floor(days[1] / 2)], sourceKey: 'house-rule' },
]

const herbLife: readonly KeepingTime[] = [
  { fromC: freezing, toC: 2, days: [21, 21], sourceKey: 'ucd-produce-facts' },
  { fromC: 2, toC: 5, days: [14, 14], sourceKey: 'ucd-produce-facts' },
]

const soldBy: Record<CropGroup, readonly SaleUnitKind[]> = {
  lettuce: ['head', 'weight'],
  greens: ['bunch', 'weight'],
  herb: ['bunch', 'weight'],
  microgreen: ['weight'],
  onion: ['bunch', 'weight'],
  fruit: ['weight', 'each'],
  berry: ['dry-pint', 'weight'],
}

type Row = Pick<Crop, 'id' | 'name' | 'storeC' | 'humidityPct' | 'keeps' | 'sourceKeys'> &
  Partial<
    Pick<Crop, 'alsoCalled' | 'taxonId' | 'chillsBelowC' | 'soldBy' | 'bunchNeedsWeight' | 'isLeafyGreen'>
  >

const crop = (group: CropGroup, row: Row): Crop => ({
  alsoCalled: [],
  taxonId: null,
  chillsBelowC: null,
  soldBy: soldBy[group],
  bunchNeedsWeight: group === 'greens',
  isLeafyGreen: group === 'lettuce' || group === 'greens',
  ...row,
  group,
})

const guide = 'ne-veg-guide'
const herb = (id: string, name: string, alsoCalled: readonly string[] = []): Crop =>
  crop('herb', {
    id,
    name,
    alsoCalled,
    storeC: [0, 0],
    humidityPct: [95, 100],
    keeps: herbLife,
    sourceKeys: ['ucd-produce-facts'],
  })

// prettier-ignore
export const crops: readonly Crop[] = [
  crop('lettuce', { id: 'leaf_lettuce', name: 'Leaf lettuce', alsoCalled: ['lettuce', 'oakleaf lettuce', 'lollo rosso'], storeC: [0, 2], humidityPct: [95, 95], keeps: nearFreezing([7, 7], guide), sourceKeys: [guide] }),
  crop('lettuce', { id: 'bibb_lettuce', name: 'Bibb lettuce', alsoCalled: ['butterhead lettuce', 'butter lettuce', 'Boston lettuce', 'buttercrunch'], storeC: [0, 2], humidityPct: [95, 95], keeps: nearFreezing([7, 7], guide), sourceKeys: [guide] }),
  crop('lettuce', { id: 'romaine_lettuce', name: 'Romaine lettuce', alsoCalled: ['romaine', 'cos lettuce'], storeC: [0, 2], humidityPct: [95, 95], keeps: nearFreezing([7, 14], guide), sourceKeys: [guide] }),
  crop('lettuce', { id: 'crisphead_lettuce', name: 'Crisphead lettuce', alsoCalled: ['iceberg lettuce', 'iceberg', 'Batavian lettuce'], storeC: [0, 2], humidityPct: [95, 95], keeps: nearFreezing([14, 21], guide), sourceKeys: [guide] }),
  crop('lettuce', { id: 'endive', name: 'Endive', alsoCalled: ['escarole', 'frisee'], storeC: [0, 0], humidityPct: [90, 95], keeps: nearFreezing([14, 21], guide), sourceKeys: [guide] }),
  crop('greens', { id: 'kale', name: 'Kale', alsoCalled: ['curly kale', 'lacinato kale', 'dinosaur kale'], storeC: [0, 0], humidityPct: [90, 95], keeps: nearFreezing([7, 14], guide), sourceKeys: [guide] }),
  crop('greens', { id: 'collards', name: 'Collards', alsoCalled: ['collard greens'], storeC: [0, 0], humidityPct: [90, 95], keeps: nearFreezing([7, 14], guide), sourceKeys: [guide] }),
  crop('greens', { id: 'chard', name: 'Chard', alsoCalled: ['Swiss chard', 'rainbow chard', 'silverbeet'], storeC: [0, 0], humidityPct: [95, 98], keeps: nearFreezing([10, 14], 'memory'), sourceKeys: ['memory'] }),
  crop('greens', { id: 'spinach', name: 'Spinach', storeC: [0, 0], humidityPct: [95, 98], keeps: nearFreezing([10, 14], 'memory'), bunchNeedsWeight: false, sourceKeys: ['memory'] }),
  crop('greens', { id: 'bok_choy', name: 'Bok choy', alsoCalled: ['pak choi', 'pak choy'], storeC: [0, 0], humidityPct: [95, 100], keeps: nearFreezing([14, 21], 'memory'), soldBy: ['head', 'bunch', 'weight'], sourceKeys: ['memory'] }),
  crop('greens', { id: 'mustard_greens', name: 'Mustard greens', alsoCalled: ['mizuna', 'tatsoi'], storeC: [0, 0], humidityPct: [90, 95], keeps: nearFreezing([7, 14], 'memory'), sourceKeys: ['memory'] }),
  crop('greens', { id: 'arugula', name: 'Arugula', alsoCalled: ['rocket', 'roquette'], storeC: [0, 0], humidityPct: [95, 100], keeps: nearFreezing([7, 10], 'memory'), sourceKeys: ['memory'] }),
  crop('greens', { id: 'watercress', name: 'Watercress', storeC: [0, 0], humidityPct: [95, 100], keeps: nearFreezing([7, 14], 'memory'), sourceKeys: ['memory'] }),
  crop('greens', { id: 'water_spinach', name: 'Water spinach', taxonId: 'water_spinach', storeC: null, humidityPct: null, keeps: [], sourceKeys: ['memory'] }),
  // Published tables say 8-10 °C and above 10 °C; the leaf was seen to suffer below 12 °C, so that is our least.
  crop('herb', { id: 'basil', name: 'Basil', alsoCalled: ['sweet basil', 'Genovese basil', 'Thai basil'], storeC: [12, 15], humidityPct: [90, 95], chillsBelowC: 12, sourceKeys: ['lange-cameron-1994', 'house-rule', guide], keeps: [
    { fromC: 4, toC: 6, days: [3, 4], sourceKey: 'lange-cameron-1997' },
    { fromC: 7.7, toC: 10, days: [4, 7], sourceKey: guide },
    { fromC: 10, toC: 15, days: [7, 14], sourceKey: 'ucd-produce-facts' },
  ] }),
  crop('herb', { id: 'parsley', name: 'Parsley', storeC: [0, 0], humidityPct: [95, 95], keeps: nearFreezing([30, 60], guide), sourceKeys: [guide] }),
  herb('mint', 'Mint', ['spearmint', 'peppermint']),
  herb('cilantro', 'Cilantro', ['coriander']),
  herb('dill', 'Dill'),
  herb('chives', 'Chives', ['garlic chives']),
  herb('oregano', 'Oregano'),
  herb('thyme', 'Thyme'),
  crop('onion', { id: 'green_onion', name: 'Green onions', alsoCalled: ['scallion', 'spring onion', 'bunching onion'], storeC: [0, 0], humidityPct: [90, 95], keeps: nearFreezing([7, 10], guide), sourceKeys: [guide] }),
  crop('microgreen', { id: 'microgreens', name: 'Microgreens', alsoCalled: ['micro greens', 'pea shoots', 'sunflower shoots'], storeC: [0, 4], humidityPct: [95, 95], keeps: [{ fromC: freezing, toC: 4, days: [7, 10], sourceKey: 'memory' }], sourceKeys: ['memory'] }),
  crop('fruit', { id: 'cucumber', name: 'Cucumbers', storeC: [10, 10], humidityPct: [90, 95], keeps: [{ fromC: 10, toC: 12, days: [7, 14], sourceKey: guide }], chillsBelowC: 10, sourceKeys: [guide] }),
  crop('fruit', { id: 'pepper', name: 'Peppers', alsoCalled: ['bell pepper', 'sweet pepper', 'chili', 'jalapeno'], storeC: [7, 10], humidityPct: [90, 95], keeps: [{ fromC: 7, toC: 10, days: [14, 21], sourceKey: guide }], chillsBelowC: 7, sourceKeys: [guide] }),
  crop('fruit', { id: 'tomato', name: 'Tomatoes', alsoCalled: ['ripe tomato', 'cherry tomato', 'grape tomato'], storeC: [7, 13], humidityPct: [85, 90], keeps: [{ fromC: 7, toC: 13, days: [7, 14], sourceKey: 'hb66-1954' }], chillsBelowC: 7, soldBy: ['weight', 'each', 'dry-pint'], sourceKeys: ['hb66-1954'] }),
  crop('fruit', { id: 'green_tomato', name: 'Green tomatoes', alsoCalled: ['mature green tomato'], storeC: [12.8, 15.6], humidityPct: [85, 90], keeps: [{ fromC: 12.7, toC: 15.6, days: [7, 14], sourceKey: 'hb66-1954' }], chillsBelowC: 12.7, soldBy: ['weight', 'each', 'dry-pint'], sourceKeys: ['hb66-1954'] }),
  crop('berry', { id: 'strawberry', name: 'Strawberries', storeC: [0, 0], humidityPct: [90, 95], keeps: nearFreezing([5, 7], 'memory'), sourceKeys: ['memory'] }),
]
