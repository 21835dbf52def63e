import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { Range, SpeciesRecord } from '@/shared/domain/species/species-record'
import type { SourceKey } from '@/shared/sources'

interface Advice {
  text: string
  sourceKeys: readonly SourceKey[]
}

/** What to do at either end of the way. Each says who published it, or that it is ours. */
export const advice = {
  fast: {
    text: 'Full guts foul the water of the bag.',
    sourceKeys: ['piper-1982'],
  },
  temper: {
    text: 'A difference of up to 2 °C (4 °F) needs nothing. Up to 5 °C (9 °F): float the closed bag for 20 minutes. More: bring the animals over by at most 5 °C (9 °F) an hour, 10 °C (18 °F) in all.',
    sourceKeys: ['lsu-cocahoe', 'house-rule'],
  },
  pH: {
    text: 'Match the pH to within 0.5 before release; otherwise change it by at most 0.3 in 15 minutes.',
    sourceKeys: ['memory', 'house-rule'],
  },
  open: {
    text: 'Open the bag only when its warmth matches. Net the animals out at once; do not pour the bag water in and do not bubble air through it: its ammonia turns poisonous when the carbon dioxide leaves.',
    sourceKeys: ['emerson-1975', 'house-rule'],
  },
  count: {
    text: 'Take a picture of the closed bag, then count the dead before anything else.',
    sourceKeys: ['house-rule'],
  },
  salt: {
    text: 'Salt in the packing water spares fish work: 1 to 3 g per litre of plain salt without additives. None for crayfish and prawns.',
    sourceKeys: ['memory'],
  },
  ice: {
    text: 'Half a pound of ice to a gallon cools water by about 10 °F. Ice stays outside the bags, wrapped, so that no bag freezes where it touches.',
    sourceKeys: ['lsu-cocahoe', 'house-rule'],
  },
  heat: {
    text: 'Open heat packs an hour before packing, wrap each in paper and tape it under the lid. They need air: leave two pencil holes in the box.',
    sourceKeys: ['house-rule'],
  },
} as const satisfies Record<string, Advice>

/** House rules: a small difference needs nothing, a middle one floating, a large one an hour for every so many °C. */
const NOTHING_UP_TO_C = 2
const FLOAT_UP_TO_C = 5
const FLOAT_MIN = 20
const C_PER_HOUR = 5
const MOST_C = 10

/** Minutes to bring animals from one water to another. null: further apart than 10 °C, or no figures. */
export function temperingMinutes(fromC: number, toC: number): number | null {
  const apart = Math.abs(toC - fromC)
  if (!(apart <= MOST_C)) return null
  if (apart <= NOTHING_UP_TO_C) return 0
  return apart <= FLOAT_UP_TO_C ? FLOAT_MIN : Math.ceil((apart / C_PER_HOUR) * 60)
}

const USUAL_SALT_G_PER_L: Range = [1, 3]
const stronglySalted: readonly SpeciesId[] = [
  'nile_tilapia',
  'blue_tilapia',
  'mozambique_hybrid_tilapia',
  'hybrid_striped_bass',
]

/** Salt in the packing water, g per L (from memory). null: none. */
export function saltGPerL({ id, kind }: SpeciesRecord<SpeciesId>): Range | null {
  if (kind !== 'fish') return null
  return stronglySalted.includes(id) ? [5, 10] : USUAL_SALT_G_PER_L
}
