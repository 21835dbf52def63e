import { convertQuantity } from '@/shared/units/convert-quantity'
import { roundTo } from '@/shared/units/round-to'
import type { UnitSystem } from '@/shared/units/unit-system'

/** The international pound, exact. */
export const gramsPerPound = 453.59237
export const gramsPerOunce = gramsPerPound / 16
const gramsIn: Record<string, number> = {
  mg: 0.001,
  g: 1,
  gram: 1,
  grams: 1,
  kg: 1000,
  oz: gramsPerOunce,
  ounce: gramsPerOunce,
  ounces: gramsPerOunce,
  lb: gramsPerPound,
  lbs: gramsPerPound,
  pound: gramsPerPound,
  pounds: gramsPerPound,
}

/** g → lb, no rounding. */
export const poundsFromG = (massG: number) => massG / gramsPerPound
/** lb → g, no rounding. */
export const gramsFromPounds = (pounds: number) => pounds * gramsPerPound

/** '2 lb', '40 g', '8 oz', '1.2 kg' → g; a bare number is read as lb or kg. null: not readable. */
export function parseMassG(text: string, units: UnitSystem): number | null {
  return convertQuantity(text, gramsIn, units === 'us' ? 'lb' : 'kg')
}

/** '2.5 lb', '8 oz', '0.1 oz'; '1.1 kg', '40 g', '1.9 g'. */
export function printMass(massG: number, units: UnitSystem): string {
  if (units === 'us') {
    return massG >= gramsPerPound ? `${step(poundsFromG(massG))} lb` : `${step(massG / gramsPerOunce)} oz`
  }
  return massG >= 1000 ? `${step(massG / 1000)} kg` : `${step(massG)} g`
}

function step(value: number): string {
  const shown = value >= 10 ? roundTo(value, 1) : value >= 0.1 ? roundTo(value, 0.1) : roundTo(value, 0.01)
  return shown.toLocaleString('en-US')
}
