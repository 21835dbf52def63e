import { newestThreshold } from '@/shared/domain/produce/farm-thresholds.facts'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { COLD_HOLD_C } from '@/shared/domain/produce/judge-holding'
import { keepingTime } from '@/shared/domain/produce/sell-by'
import { countInWeight } from '@/shared/domain/worms/worm-count'
import { HEAT_KILLS_C } from '@/shared/domain/worms/heat-treated'
import { gramsPerPound } from '@/shared/units/mass'
import { celsiusFromF, fahrenheitFromC } from '@/shared/units/temperature'
import type { Check } from './check'

/** Storage rows typed from the publications once more: crop, the temperature asked for in °F, shortest and longest life. */
type Row = readonly [crop: string, heldF: number, days: readonly [number, number]]

const guide: readonly Row[] = [
  ['basil', 46, [4, 7]],
  ['basil', 50, [4, 7]],
  ['leaf_lettuce', 32, [7, 7]],
  ['bibb_lettuce', 34, [7, 7]],
  ['romaine_lettuce', 32, [7, 14]],
  ['crisphead_lettuce', 32, [14, 21]],
  ['kale', 32, [7, 14]],
  ['collards', 32, [7, 14]],
  ['endive', 32, [14, 21]],
  ['parsley', 32, [30, 60]],
  ['cucumber', 50, [7, 14]],
  ['pepper', 45, [14, 21]],
  ['pepper', 50, [14, 21]],
  ['green_onion', 32, [7, 10]],
]
const davis: readonly Row[] = [
  ...['mint', 'cilantro', 'dill', 'chives', 'oregano', 'thyme'].flatMap((crop): Row[] => [
    [crop, 32, [21, 21]],
    [crop, 41, [14, 14]],
  ]),
  ['basil', 54, [7, 14]],
]
const handbook1954: readonly Row[] = [
  ['tomato', 45, [7, 14]],
  ['tomato', 55, [7, 14]],
  ['green_tomato', 55, [7, 14]],
  ['green_tomato', 60, [7, 14]],
]
const sweetBasil: readonly Row[] = [['basil', 41, [3, 4]]]

function lives(from: string, rows: readonly Row[]): Check[] {
  return rows.flatMap(([crop, heldF, published]) =>
    ([0, 1] as const).map((end) => ({
      what: `${crop} at ${heldF} °F, ${end === 0 ? 'shortest' : 'longest'} days`,
      published: published[end],
      ours: () => {
        const found = findCrop(crop)
        return (found && keepingTime(found, celsiusFromF(heldF))?.days[end]) ?? null
      },
      within: 0,
      because: 'days are taken over as printed (a week is 7, a month 30)',
      from,
    })),
  )
}

/** Best temperatures as printed in °F; °C in our facts are rounded to whole degrees. */
const stores: readonly (readonly [crop: string, loF: number, hiF: number])[] = [
  ['tomato', 45, 55],
  ['green_tomato', 55, 60],
  ['leaf_lettuce', 32, 36],
  ['kale', 32, 32],
  ['cucumber', 50, 50],
  ['pepper', 45, 50],
]
const storeChecks: Check[] = stores.flatMap(([crop, loF, hiF]) =>
  ([0, 1] as const).map((end) => ({
    what: `${crop}, ${end === 0 ? 'coldest' : 'warmest'} storage, °F`,
    published: end === 0 ? loF : hiF,
    ours: () => {
      const range = findCrop(crop)?.storeC
      return range ? fahrenheitFromC(range[end]) : null
    },
    within: 0.9,
    because: 'half a degree Celsius, to which the facts are rounded',
    from: 'storage tables in °F',
  })),
)

const exact = { within: 1e-9, because: 'the same temperature in the other scale' }
const deflators = [90.999, 116.82] as const

export const produceChecks: readonly Check[] = [
  ...lives('New England Vegetable Management Guide, table 16', guide),
  ...lives('UC Davis Produce Facts, fresh culinary herbs', davis),
  ...lives('USDA Handbook 66 of 1954, as reproduced', handbook1954),
  ...lives('Lange & Cameron 1997, sweet basil at 5 °C', sweetBasil),
  ...storeChecks,
  {
    what: 'cold holding of cut leafy greens, °F',
    published: 41,
    ours: () => fahrenheitFromC(COLD_HOLD_C),
    ...exact,
    from: 'Food Code',
  },
  {
    what: 'heat that kills worms in compost, °F',
    published: 131,
    ours: () => fahrenheitFromC(HEAT_KILLS_C),
    ...exact,
    from: 'University of Minnesota',
  },
  {
    what: 'produce sales below which a farm is not covered, 2021 to 2023',
    published: (25_000 * deflators[1]) / deflators[0],
    ours: () => newestThreshold('not-covered').dollars,
    within: 50,
    because: 'our sum is rounded to hundreds; the agency posts its own',
    from: 'deflators of the agency, base $25,000',
  },
  {
    what: 'red wigglers in a pound, fewest',
    published: 800,
    ours: () => countInWeight('red_wiggler', gramsPerPound)?.[0] ?? null,
    within: 0,
    because: 'a round figure of the trade',
    from: 'trade practice, bed-run',
  },
]
