import { findMedia } from '@/shared/domain/media/find-media'
import {
  bulkDensityKgPerM3,
  cubicFootKg,
  expectedWeightKg,
  volumeL,
  weightKg,
} from '@/shared/domain/media/media-weight'
import { gramsPerPound } from '@/shared/units/mass'
import { litresPerCubicFoot } from '@/shared/units/volume'
import { checksOf, type Check } from './check'

const poundsOfCubicFoot = (densityKgPerM3: number) => (cubicFootKg(densityKgPerM3) * 1000) / gramsPerPound
const edge = (id: string, litres: number, at: 0 | 1) => {
  const material = findMedia(id)
  return (material && expectedWeightKg(material, litres)?.[at]) ?? null
}

const worked = { from: 'worked example of gravel, 1,600 kg/m³', because: 'half of the last digit printed' }
const bag = {
  from: 'loose weights of media by the 50 L bag',
  because: 'printed in whole or half kilograms',
  within: 0.51,
}
const foot = {
  from: 'loose weights of media by the cubic foot',
  because: 'printed in whole pounds',
  within: 0.51,
}

type Row = readonly [what: string, key: readonly [string, 0 | 1], published: number]
// The range of expanded clay is the union of the maker's 250-450 and the encyclopaedia's 300-500.
const bags: readonly Row[] = [
  ['expanded clay, lightest', ['expanded_clay', 0], 13],
  ['expanded clay, heaviest', ['expanded_clay', 1], 25],
  ['perlite, lightest', ['perlite', 0], 4],
  ['perlite, heaviest', ['perlite', 1], 6.5],
  ['vermiculite, lightest', ['vermiculite', 0], 4],
  ['vermiculite, heaviest', ['vermiculite', 1], 6.5],
  ['pumice, lightest', ['pumice', 0], 25],
  ['pumice, heaviest', ['pumice', 1], 35],
  ['lava rock, lightest', ['lava_rock', 0], 35],
  ['lava rock, heaviest', ['lava_rock', 1], 48],
  ['expanded shale, lightest', ['expanded_shale', 0], 33],
  ['expanded shale, heaviest', ['expanded_shale', 1], 45],
  ['gravel, lightest', ['gravel', 0], 75],
  ['gravel, heaviest', ['gravel', 1], 85],
  ['coir, lightest', ['coir', 0], 13],
  ['coir, heaviest', ['coir', 1], 20],
]
const feet: readonly Row[] = [
  ['expanded clay, lightest', ['expanded_clay', 0], 16],
  ['expanded clay, heaviest', ['expanded_clay', 1], 31],
  ['perlite, lightest', ['perlite', 0], 5],
  ['perlite, heaviest', ['perlite', 1], 8],
  ['pumice, lightest', ['pumice', 0], 31],
  ['pumice, heaviest', ['pumice', 1], 44],
  ['lava rock, lightest', ['lava_rock', 0], 44],
  ['lava rock, heaviest', ['lava_rock', 1], 59],
  ['expanded shale, lightest', ['expanded_shale', 0], 41],
  ['expanded shale, heaviest', ['expanded_shale', 1], 56],
  ['gravel, lightest', ['gravel', 0], 94],
  ['gravel, heaviest', ['gravel', 1], 106],
  ['coir, lightest', ['coir', 0], 16],
  ['coir, heaviest', ['coir', 1], 25],
]

export const mediaChecks: readonly Check[] = [
  {
    what: '50 L of gravel, kg',
    published: 80,
    ours: () => weightKg(50, 1600),
    within: 1e-9,
    ...worked,
    because: 'exact',
  },
  {
    what: 'a cubic foot of gravel, lb',
    published: 99.9,
    ours: () => poundsOfCubicFoot(1600),
    within: 0.05,
    ...worked,
  },
  {
    what: '80 kg of gravel, L',
    published: 50,
    ours: () => volumeL(80, 1600),
    within: 1e-9,
    ...worked,
    because: 'exact',
  },
  {
    what: '80 kg in 50 L, kg/m³',
    published: 1600,
    ours: () => bulkDensityKgPerM3(50, 80),
    within: 1e-9,
    ...worked,
    because: 'exact',
  },
  {
    what: '50 L of 10-20 mm clay, kg',
    published: 13.3,
    ours: () => weightKg(50, 265),
    within: 0.051,
    from: "maker's data",
    because: 'printed to 0.1 kg',
  },
  {
    what: 'a cubic foot of 10-20 mm clay, lb',
    published: 16.5,
    ours: () => poundsOfCubicFoot(265),
    within: 0.05,
    from: "maker's data",
    because: 'printed to 0.1 lb',
  },
  ...checksOf(
    bag,
    bags.map(([what, key, published]) => [what, key.join(), published] as const),
    (key) => ofKey(key, 50),
  ),
  ...checksOf(
    foot,
    feet.map(([what, key, published]) => [what, key.join(), published] as const),
    (key) => {
      const kilograms = ofKey(key, litresPerCubicFoot)
      return kilograms === null ? null : (kilograms * 1000) / gramsPerPound
    },
  ),
]

function ofKey(key: string, litres: number): number | null {
  const [id = '', at] = key.split(',')
  return edge(id, litres, at === '1' ? 1 : 0)
}
