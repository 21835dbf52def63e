import { gramsPerPound } from '@/shared/units/mass'
import { litresPerGallon } from '@/shared/units/volume'

/** lb per US gal → g per L, no rounding. */
export const gPerLFromPoundsPerGal = (load: number) => (load * gramsPerPound) / litresPerGallon
/** g per L → lb per US gal, no rounding. */
export const poundsPerGalFromGPerL = (load: number) => (load * litresPerGallon) / gramsPerPound
