import { fedCatfishOxygenDemandMgPerKgHour } from '@/shared/domain/animals/fed-catfish-oxygen-demand'
import { fultonMassG } from '@/shared/domain/animals/length-to-mass'
import { oxygenDemandMgPerKgHour } from '@/shared/domain/animals/oxygen-demand'
import type { OxygenModelId } from '@/shared/domain/animals/oxygen-models.facts'
import { packedOxygenDemandMgPerKgHour } from '@/shared/domain/animals/packed-oxygen-demand'
import { salmonidOxygenDemandMgPerKgHour } from '@/shared/domain/animals/salmonid-oxygen-demand'
import { bagChemistry, type BagWater } from '@/shared/domain/transport/bag-chemistry'
import { bagLoadGPerL } from '@/shared/domain/transport/bag-loading'
import { oxygenGasGPerL } from '@/shared/domain/transport/gas-density'
import { catfishHaulGPerL, haulAtF } from '@/shared/domain/transport/hauling-load'
import { poundsPerGalFromGPerL } from '@/shared/units/load'
import {
  doublingFactor,
  piperCatfishFactor,
  piperLinearFactor,
} from '@/shared/domain/transport/warmth-of-load'
import {
  carbonDioxideMgPerL,
  carbonDioxideOstwald,
  carbonDioxideSolubility,
  carbonicPK1,
} from '@/shared/domain/water/carbon-dioxide'
import { gramsFromPounds } from '@/shared/units/mass'
import { celsiusFromF } from '@/shared/units/temperature'
import { checksOf, type Check } from './check'

const demandAt = [
  { massG: 1, waterC: 15 },
  { massG: 1, waterC: 20 },
  { massG: 1, waterC: 25 },
  { massG: 10, waterC: 20 },
] as const

const demandRows: readonly (readonly [OxygenModelId, readonly [number, number, number, number]])[] = [
  ['tilapia-adult', [227.9, 361.1, 557.5, 162.0]],
  ['bluegill-juvenile', [161.0, 239.0, 346.9, 150.8]],
  ['perch-juvenile', [179.8, 251.5, 341.9, 158.7]],
  ['trout-adult', [519.1, 677.2, 541.5, 410.9]],
  ['bass-adult', [567.5, 663.7, 776.1, 293.1]],
  ['striped-bass-young', [522.0, 792.0, 1201.8, 425.1]],
  ['brown-bullhead', [172.6, 272.7, 431.0, 146.1]],
  ['roach', [250.0, 452.9, 820.3, 337.8]],
  ['fathead', [147.4, 245.6, 362.5, 223.5]],
]

const demandChecks: readonly Check[] = demandRows.flatMap(([model, cells]) =>
  demandAt.map((at, index) => {
    const published = cells[index] ?? NaN
    return {
      what: `oxygen use, ${model}, ${at.massG} g, ${at.waterC} °C`,
      published,
      ours: () => oxygenDemandMgPerKgHour({ model, ...at }),
      within: published * 0.005,
      because: 'half a percent: four printed digits of the parameters',
      from: 'Fish Bioenergetics 4.0, computed from its parameter table',
    }
  }),
)

const bag = { waterL: 7.57, oxygenL: 22.7, alkalinityMeqPerL: 2 }
type Kind = keyof BagWater
const bagRows: readonly (readonly [OxygenModelId, number, Readonly<Record<Kind, number | null>>])[] = [
  [
    'tilapia-adult',
    25,
    {
      oxygenUsedG: 2.46,
      oxygenHadG: 27.2,
      co2MgPerL: 107,
      tanMgPerL: 32.5,
      pH: 6.3,
      nh3NMgPerL: 0.0255,
      oxygenMgPerL: null,
    },
  ],
  [
    'tilapia-adult',
    84,
    {
      oxygenUsedG: 8.27,
      oxygenHadG: 27.2,
      co2MgPerL: 358,
      tanMgPerL: 109,
      pH: 5.77,
      nh3NMgPerL: 0.0255,
      oxygenMgPerL: null,
    },
  ],
  [
    'tilapia-adult',
    323,
    {
      oxygenUsedG: 31.8,
      oxygenHadG: 27.2,
      co2MgPerL: 1376,
      tanMgPerL: 420,
      pH: 5.19,
      nh3NMgPerL: 0.0256,
      oxygenMgPerL: null,
    },
  ],
  [
    'bluegill-juvenile',
    84,
    {
      oxygenUsedG: 5.47,
      oxygenHadG: 27.2,
      co2MgPerL: 237,
      tanMgPerL: 72,
      pH: 5.95,
      nh3NMgPerL: 0.0255,
      oxygenMgPerL: null,
    },
  ],
]
const bagWithin: Readonly<Record<Kind, number>> = {
  oxygenUsedG: 0.05,
  oxygenHadG: 0.05,
  co2MgPerL: 1,
  tanMgPerL: 0.5,
  pH: 0.01,
  nh3NMgPerL: 0.0002,
  oxygenMgPerL: 0,
}

const bagChecks: readonly Check[] = bagRows.flatMap(([model, gPerL, figures]) =>
  (Object.keys(figures) as Kind[]).flatMap((kind) => {
    const published = figures[kind]
    if (published === null) return []
    const ours = () => {
      const demand = packedOxygenDemandMgPerKgHour({ model, massG: 1, waterC: 20 })
      const usedG = demand && (demand * ((gPerL * bag.waterL) / 1000) * 24) / 1000
      return usedG && (bagChemistry(bag, usedG, 20)?.[kind] ?? null)
    }
    const what = `worked bag, ${model}, ${gPerL} g/L: ${kind}`
    return [
      {
        what,
        published,
        ours,
        within: bagWithin[kind],
        because: 'printed digits',
        from: 'worked bag, computed',
      },
    ]
  }),
)

const factors = [
  [piperLinearFactor, 'Piper linear', [2.11, 1.56, 1, 0.44, 0]],
  [piperCatfishFactor, 'Piper catfish', [1.5, 1.25, 1, 0.75, 0.5]],
  [doublingFactor, 'doubling', [2.16, 1.47, 1, 0.68, 0.46]],
] as const

const fahrenheits = [45, 55, 65, 75, 85]
const factorChecks: readonly Check[] = factors.flatMap(([factor, name, cells]) =>
  fahrenheits.map((waterF, at) => ({
    what: `share of the load, ${name}, ${waterF} °F`,
    published: cells[at] ?? NaN,
    ours: () => factor(waterF),
    within: 0.0051,
    because: 'two printed decimals',
    from: 'Piper et al. 1982; Swann MX392, computed',
  })),
)

const one = (what: string, published: number) => [[what, what, published]] as const
const byC = (what: string, cells: readonly number[]) =>
  cells.map((value, at) => [`${what} at ${10 + at * 5} °C`, 10 + at * 5, value] as const)
const third = (within: number) => ({
  from: 'computed from the equation named',
  within,
  because: 'printed digits',
})
const massOf100 = (fultonMassG(1.5, 5.08) ?? NaN) * 100
const bluegillBag = (waterF: number) => bagLoadGPerL({ stage: 'fingerling', hours: 24, waterF }) ?? NaN

export const transportChecks: readonly Check[] = [
  ...demandChecks,
  ...checksOf(
    { from: 'Liao 1971, computed', within: 0.1, because: 'one printed decimal' },
    [
      ['trout, 50 °F, 0.01 lb', '50 0.01', 310.7],
      ['trout, 55 °F, 0.1 lb', '55 0.1', 295.4],
      ['trout, 60 °F, 1 lb', '60 1', 252.7],
    ],
    (key) => {
      const [fahrenheit = NaN, pounds = NaN] = key.split(' ').map(Number)
      return salmonidOxygenDemandMgPerKgHour(gramsFromPounds(pounds), celsiusFromF(fahrenheit))
    },
  ),
  ...checksOf(
    {
      from: 'Boyd, Romaire & Johnston 1978, computed',
      within: 0.6,
      because: 'whole mg printed, and 308.5 was rounded up',
    },
    [
      ['fed catfish of 5 g, 25 °C', 5, 650],
      ['fed catfish of 50 g, 25 °C', 50, 591],
      ['fed catfish of 500 g, 25 °C', 500, 309],
    ],
    (massG) => fedCatfishOxygenDemandMgPerKgHour(massG, 25),
  ),
  ...checksOf(third(0.0005), byC('oxygen gas, g/L', [1.377, 1.353, 1.33, 1.308]), oxygenGasGPerL),
  ...checksOf(third(0.00001), byC('K0 of CO2', [0.05366, 0.04553, 0.0391, 0.03397]), carbonDioxideSolubility),
  ...checksOf(third(0.001), byC('Ostwald of CO2', [1.244, 1.074, 0.939, 0.829]), carbonDioxideOstwald),
  ...checksOf(third(0.001), byC('pK1', [6.464, 6.419, 6.381, 6.352]), carbonicPK1),
  ...checksOf(third(0.2), one('CO2 at 2 meq/L, pH 7.0, 20 °C', 21.2), () =>
    carbonDioxideMgPerL({ waterC: 20, alkalinityMeqPerL: 2 }, 7),
  ),
  ...bagChecks,
  ...checksOf(
    { from: 'Dupree & Huner 1984, between columns', within: 0.1, because: 'stated with the example' },
    one('swim-up fry, 36 h, 65 °F, g/L', 35.9),
    () => bagLoadGPerL({ stage: 'swim-up-fry', hours: 36, waterF: 65 }),
  ),
  ...factorChecks,
  ...checksOf(
    { from: 'doubling per 10 °C, computed', within: 0.0005, because: 'three printed decimals' },
    [
      ['oxygen use, 10 °C colder', -10, 0.5],
      ['oxygen use, 5 °C colder', -5, 0.707],
      ['oxygen use, 5 °C warmer', 5, 1.414],
      ['oxygen use, 10 °C warmer', 10, 2],
    ],
    (byC) => 1 / doublingFactor(65 + byC * 1.8),
  ),
  ...checksOf(
    { from: 'Piper et al. 1982 p. 362', within: 1e-9, because: 'the rule itself' },
    [
      ['catfish tank at 55 °F, lb/gal', 55, 5],
      ['catfish tank at 65 °F, lb/gal', 65, 4],
      ['catfish tank at 75 °F, lb/gal', 75, 3],
    ],
    (waterF) => poundsPerGalFromGPerL(catfishHaulGPerL(waterF)),
  ),
  ...checksOf(
    { from: 'Piper et al. 1982 p. 362, in g/L', within: 0.5, because: 'whole g printed' },
    one('catfish tank at 65 °F, g/L', 479),
    () => catfishHaulGPerL(65),
  ),
  ...checksOf(
    { from: 'Piper et al. 1982 p. 356, worked example', within: 0.5, because: 'whole lb printed' },
    [
      ['1,000 lb of trout at 52 °F, at 57 °F', 57, 722],
      ['1,000 lb of trout at 52 °F, at 47 °F', 47, 1278],
    ],
    (waterF) => haulAtF(1000, 52, waterF),
  ),
  ...checksOf(
    { from: 'end-to-end example, house rules', within: 0.05, because: 'one printed decimal' },
    one('100 hybrid bluegill of 2 in, g', 196.6),
    () => massOf100,
  ),
  ...checksOf(
    { from: 'end-to-end example, house rules', within: 0.05, because: 'one printed decimal' },
    [
      ['fingerlings, 24 h, 65 °F, g/L', 65, 83.9],
      ['fingerlings, 24 h, 75 °F, g/L', 75, 37.2],
    ],
    bluegillBag,
  ),
  ...checksOf(
    { from: 'end-to-end example, house rules', within: 0.006, because: 'two printed decimals' },
    [
      ['water for 100 bluegill, 65 °F, L', 65, 2.34],
      ['water for 100 bluegill, 75 °F, L', 75, 5.28],
    ],
    (waterF) => massOf100 / bluegillBag(waterF),
  ),
]
