import { bassGrowthIndex } from '@/shared/domain/growth/bass-growth-index'
import { daysOfDegreeDays } from '@/shared/domain/growth/degree-days'
import { massAfterG, tgcX1000Of } from '@/shared/domain/growth/thermal-growth'
import { troutCmPerMonth } from '@/shared/domain/growth/trout-length-growth'
import {
  catfishTableMassG,
  fultonMassG,
  fultonOfPiperC,
  standardWeightG,
} from '@/shared/domain/animals/length-to-mass'
import { countOfLot, meanMassOfSamplesG } from '@/shared/domain/animals/sample-count'
import { findSpecies } from '@/shared/domain/species/find-species'
import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { StandardWeight } from '@/shared/domain/species/species-record'
import { gramsPerOunce, gramsPerPound } from '@/shared/units/mass'
import { celsiusFromF } from '@/shared/units/temperature'
import { checksOf, type Check } from './check'

// Rainbow trout of streams: the product plans by the heavier lake fish, the table's second row is checked here.
const lotic: StandardWeight = {
  a: -5.023,
  b: 3.024,
  c: 0,
  leastMm: 120,
  mostMm: null,
  author: 'Simpkins & Hubert 1996',
}

const standard = (id: SpeciesId | 'lotic', lengthMm: number) => {
  const row = id === 'lotic' ? lotic : findSpecies(id)?.standardWeight
  return row ? standardWeightG(row, lengthMm) : null
}

type StandardRow = readonly [SpeciesId | 'lotic', number, number]
const standardRows: readonly StandardRow[] = [
  ['bluegill', 100, 18.11],
  ['bluegill', 150, 69.49],
  ['hybrid_bluegill', 100, 19.36],
  ['hybrid_bluegill', 150, 68.09],
  ['largemouth_bass', 150, 39.3],
  ['channel_catfish', 100, 6.14],
  ['channel_catfish', 150, 23.34],
  ['yellow_perch', 100, 11.86],
  ['yellow_perch', 150, 43.93],
  ['rainbow_trout', 150, 40.6],
  ['lotic', 150, 36.1],
  ['hybrid_striped_bass', 150, 42.63],
  ['golden_shiner', 100, 10.26],
  ['golden_shiner', 150, 39.12],
  ['nile_tilapia', 100, 20.67],
  ['nile_tilapia', 150, 75.96],
]

const catfishK = fultonOfPiperC(2918e-7)
const once = (what: string, published: number) => [[what, what, published]] as const
const ounces = (count: number, oz: number) => ({ count, massG: oz * gramsPerOunce })
const lot600 = [{ count: 600, massG: 2.06 * gramsPerPound }]
const acre = (poundsEach: number) =>
  countOfLot([{ count: 1, massG: poundsEach * gramsPerPound }], 3500 * gramsPerPound)

export const growthChecks: readonly Check[] = [
  ...standardRows.map(([id, lengthMm, published]) => ({
    what: `standard weight, ${id}, ${lengthMm} mm`,
    published,
    ours: () => standard(id, lengthMm),
    within: 0.006,
    because: 'two printed decimals',
    from: 'FSA, table WSlit',
  })),
  ...checksOf(
    { from: 'Piper et al. 1982 p. 61', within: 0.01, because: 'two printed decimals of K' },
    once('catfish K × 1e7 from C 2918e-7', 80.76),
    () => catfishK * 100,
  ),
  ...checksOf(
    { from: 'Piper et al. 1982 p. 61, computed', within: 0.01, because: 'two printed decimals' },
    [
      ['catfish of 4 in', 10.16, 8.47],
      ['catfish of 100 mm', 10, 8.08],
    ],
    (lengthCm) => fultonMassG(catfishK, lengthCm),
  ),
  ...checksOf(
    { from: 'Piper et al. 1982 p. 61, computed', within: 0.1, because: 'one printed decimal' },
    once('catfish of 4 in per lb', 53.5),
    () => gramsPerPound / (fultonMassG(catfishK, 10.16) ?? NaN),
  ),
  ...checksOf(
    { from: 'Alabama Cooperative Extension, table 7', within: 1e-9, because: 'the table itself' },
    [1, 2, 3, 4, 5, 6, 7, 8, 9, 10].map(
      (inches, at) =>
        [
          `catfish of ${inches} in, lb per 1,000`,
          inches,
          [0.7, 3.5, 10, 20, 32, 60, 93, 112, 180, 328][at] ?? NaN,
        ] as const,
    ),
    (inches) => ((catfishTableMassG(inches) ?? NaN) * 1000) / gramsPerPound,
  ),
  ...checksOf(
    {
      from: 'the same bulletin, sample count',
      within: 0.003,
      because: '3.4375 is shown as 3.44; the print rounds to 3.5',
    },
    once('lb per 1,000 of two samples of 200', 3.44),
    () => ((meanMassOfSamplesG([ounces(200, 10), ounces(200, 12)]) ?? NaN) * 1000) / gramsPerPound,
  ),
  ...checksOf(
    { from: 'UF/IFAS catfish fingerling bulletin', within: 0.5, because: 'whole fish' },
    once('fish in 500 lb by a sample of 600 in 2.06 lb', 145_631),
    () => countOfLot(lot600, 500 * gramsPerPound),
  ),
  ...checksOf(
    {
      from: 'UF/IFAS stocking example',
      within: 0.5,
      because: 'whole fish; the stored page misprints 53,333 for the first division',
    },
    [
      ['fish per acre at 0.06 lb', 0.06, 58_333],
      ['fish per acre at 0.02 lb', 0.02, 175_000],
    ],
    acre,
  ),
  ...checksOf(
    {
      from: 'AquaSearch, worked example (prints 0.222 × 100)',
      within: 0.0005,
      because: 'five digits computed',
    },
    once('TGC × 1000 of 10 → 350 g, 11 °C, 200 d', 2.224),
    () => tgcX1000Of({ fromG: 10, toG: 350, degreeDaysC: 2200 }),
  ),
  ...checksOf(
    { from: 'Iwama & Tautz 1981, computed', within: 0.01, because: 'two printed decimals' },
    once('10 g after 100 d at 12 °C, TGC 1.8', 80.31),
    () => massAfterG({ massG: 10, tgcX1000: 1.8, waterC: 12, days: 100 }),
  ),
  ...[
    { fromG: 5, toG: 20, days: 30, published: 1.2 },
    { fromG: 50, toG: 100, days: 30, published: 1.14 },
    { fromG: 100, toG: 250, days: 50, published: 1.18 },
    { fromG: 250, toG: 450, days: 70, published: 0.7 },
  ].map(({ fromG, toG, days, published }) => ({
    what: `TGC × 1000 of tilapia, ${fromG} → ${toG} g in ${days} d`,
    published,
    ours: () => tgcX1000Of({ fromG, toG, degreeDaysC: days * 28 }),
    within: 0.006,
    because: 'two printed decimals',
    from: 'SRAC 282 steps at 28 °C, computed',
  })),
  ...checksOf(
    { from: 'WAS abstract 166442, computed', within: 0.001, because: 'three printed decimals' },
    [
      ['bass growth index at 15 °C', 15, 0.33],
      ['bass growth index at 24 °C', 24, 0.947],
      ['bass growth index at 26.8 °C', 26.8, 1.015],
      ['bass growth index at 30 °C', 30, 0.915],
      ['bass growth index at 33 °C', 33, 0.588],
    ],
    bassGrowthIndex,
  ),
  ...checksOf(
    { from: 'Dwyer et al. 1981 as tabled', within: 0.005, because: 'two printed decimals' },
    once('trout at 12 °C, cm per month', 1.69),
    () => troutCmPerMonth(12),
  ),
  ...checksOf(
    {
      from: 'Hinshaw & Thompson, SRAC 220',
      within: 0.05,
      because: 'the degree-days are rounded to whole ones',
    },
    [
      ['days to hatch of trout eggs at 55 °F', 55, 21],
      ['days to hatch of trout eggs at 45 °F', 45, 49],
    ],
    (fahrenheit) => {
      const window = daysOfDegreeDays([268, 354], celsiusFromF(fahrenheit))
      return window && (fahrenheit === 55 ? window[0] : window[1])
    },
  ),
]
