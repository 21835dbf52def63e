import type { Box } from '@/shared/domain/transport/box'
import type { Vessel } from '@/shared/domain/transport/trip'
import type { SourceKey } from '@/shared/sources'

/** Sizes are round figures from memory of what is sold everywhere; whoever drives measures their own. */
export const homeContainerSources: readonly SourceKey[] = ['memory', 'house-rule']

export interface HomeContainer {
  id: string
  label: string
  hint: string
  waterL: number
  box: Box
}

/** Conductivities: solid plastic about 0.2, foam between two skins about 0.035 W/(m·K) (handbook figures of foam, dry). */
const PLASTIC = 0.2
const FOAM = 0.035

/** What people bring to the gate, filled about three quarters, lid on. */
export const homeContainers: readonly HomeContainer[] = [
  {
    id: 'pail',
    label: 'A 5 gallon pail with a lid',
    hint: '4 gal (15 L) of water, thin wall',
    waterL: 15,
    box: { lengthCm: 28, widthCm: 28, heightCm: 30, wallMm: 2.5, conductivityWPerMK: PLASTIC },
  },
  {
    id: 'cooler',
    label: 'A 48 quart cooler',
    hint: '8 gal (30 L) of water, foam wall',
    waterL: 30,
    box: { lengthCm: 56, widthCm: 30, heightCm: 28, wallMm: 25, conductivityWPerMK: FOAM },
  },
  {
    id: 'tote',
    label: 'A 30 gallon tote',
    hint: '20 gal (75 L) of water, thin wall',
    waterL: 75,
    box: { lengthCm: 65, widthCm: 45, heightCm: 40, wallMm: 3, conductivityWPerMK: PLASTIC },
  },
  {
    id: 'tank',
    label: 'A 100 gallon hauling tank',
    hint: '80 gal (300 L) of water, foam wall',
    waterL: 300,
    box: { lengthCm: 110, widthCm: 65, heightCm: 55, wallMm: 38, conductivityWPerMK: FOAM },
  },
]

export const aerations: readonly { value: Vessel['aeration']; label: string; hint?: string }[] = [
  { value: 'none', label: 'None' },
  { value: 'air', label: 'Battery air pump and stone' },
  { value: 'oxygen', label: 'Oxygen from a bottle' },
]
