import type { TaxonId } from '@/shared/domain/species/taxa.facts'

/** How a kind is sold in the demo. Prices are cents for one animal at the smallest order. */
export interface StockFacts {
  taxonId: TaxonId
  cents: readonly [low: number, high: number]
  leastOrders: readonly number[]
  counts: readonly [low: number, high: number]
  /** Months (1 to 12) in which it hatches here. */
  hatchMonths: readonly number[]
  daysAnInch: number
  waterC: readonly [low: number, high: number]
  feed: string
  strain?: string
  sex: 'mixed' | 'all-male'
}

const all = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]

// Prices: invented but plausible ranges of the trade for 2026, beside district price lists of 2010 to 2016; hatching
// months follow the species facts; growth is a rough figure for the story only, never for advice.
// prettier-ignore
export const stockFacts: readonly StockFacts[] = [
  { taxonId: 'bluegill', cents: [85, 135], leastOrders: [20, 25, 50], counts: [400, 2200], hatchMonths: [5, 6, 7, 8], daysAnInch: 42, waterC: [17, 23], feed: 'Floating crumble, 2 mm, twice a day', sex: 'mixed' },
  { taxonId: 'hybrid_bluegill', cents: [90, 150], leastOrders: [20, 25], counts: [300, 1500], hatchMonths: [5, 6, 7, 8], daysAnInch: 40, waterC: [17, 23], feed: 'Floating pellets, 2 mm, eat from the hand', sex: 'mixed' },
  { taxonId: 'yellow_perch', cents: [150, 290], leastOrders: [20, 25], counts: [250, 1200], hatchMonths: [4, 5], daysAnInch: 44, waterC: [16, 21], feed: 'Sinking pellets, 44 % protein, trained since the third week', sex: 'mixed' },
  { taxonId: 'largemouth_bass', cents: [150, 280], leastOrders: [10, 20], counts: [150, 600], hatchMonths: [4, 5, 6], daysAnInch: 32, waterC: [18, 24], feed: 'Trained on 3 mm floating pellets', sex: 'mixed' },
  { taxonId: 'channel_catfish', cents: [60, 100], leastOrders: [20, 25, 50], counts: [500, 3000], hatchMonths: [6, 7], daysAnInch: 27, waterC: [18, 25], feed: 'Floating pellets, 32 % protein', sex: 'mixed' },
  { taxonId: 'nile_tilapia', cents: [75, 150], leastOrders: [10, 20, 25], counts: [200, 1800], hatchMonths: all, daysAnInch: 34, waterC: [25, 29], feed: 'Fry powder, then 1 mm crumble', sex: 'mixed' },
  { taxonId: 'blue_tilapia', cents: [75, 145], leastOrders: [10, 20], counts: [200, 1200], hatchMonths: all, daysAnInch: 36, waterC: [24, 28], feed: 'Crumble and duckweed', sex: 'mixed' },
  { taxonId: 'red_hybrid_tilapia', cents: [95, 175], leastOrders: [10, 20], counts: [150, 700], hatchMonths: all, daysAnInch: 36, waterC: [25, 29], feed: 'Crumble, 1 mm, 40 % protein', sex: 'all-male', strain: 'rose line' },
  { taxonId: 'rainbow_trout', cents: [105, 195], leastOrders: [20, 25], counts: [300, 1600], hatchMonths: [11, 12, 1, 2], daysAnInch: 38, waterC: [11, 14], feed: 'Trout pellets, 2 mm, four times a day', sex: 'mixed' },
  { taxonId: 'common_carp_koi', cents: [400, 950], leastOrders: [1, 3, 5], counts: [40, 180], hatchMonths: [5, 6, 7], daysAnInch: 30, waterC: [18, 23], feed: 'Koi pellets with spirulina', strain: 'mixed garden colours', sex: 'mixed' },
  { taxonId: 'goldfish', cents: [30, 60], leastOrders: [10, 25], counts: [200, 1500], hatchMonths: [4, 5, 6, 7], daysAnInch: 35, waterC: [17, 23], feed: 'Fine flake and crumble', sex: 'mixed' },
  { taxonId: 'fathead_minnow', cents: [12, 24], leastOrders: [50, 100], counts: [1500, 6000], hatchMonths: [5, 6, 7, 8], daysAnInch: 48, waterC: [16, 22], feed: 'Fine meal, eats algae off the walls', strain: 'rosy', sex: 'mixed' },
  { taxonId: 'golden_shiner', cents: [22, 40], leastOrders: [50, 100], counts: [800, 4000], hatchMonths: [5, 6, 7], daysAnInch: 40, waterC: [16, 22], feed: 'Meal and pond plankton', sex: 'mixed' },
  { taxonId: 'hybrid_striped_bass', cents: [140, 240], leastOrders: [20, 25], counts: [250, 1000], hatchMonths: [3, 4, 5], daysAnInch: 34, waterC: [19, 24], feed: 'Floating pellets, 42 % protein', sex: 'mixed' },
  { taxonId: 'redclaw_crayfish', cents: [250, 480], leastOrders: [6, 10], counts: [80, 300], hatchMonths: all, daysAnInch: 52, waterC: [24, 27], feed: 'Sinking wafers, oak leaves', sex: 'mixed' },
  { taxonId: 'freshwater_prawn', cents: [35, 70], leastOrders: [25, 50], counts: [300, 1500], hatchMonths: all, daysAnInch: 36, waterC: [25, 28], feed: 'Sinking crumble, 35 % protein', sex: 'mixed' },
]
