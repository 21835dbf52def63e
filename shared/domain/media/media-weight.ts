import type { Equation } from '@/shared/domain/equation'
import type { MediaMaterial } from '@/shared/domain/media/media.facts'
import type { Range } from '@/shared/domain/species/species-record'
import { printMass } from '@/shared/units/mass'
import { roundTo } from '@/shared/units/round-to'
import { litresPerCubicFoot } from '@/shared/units/volume'

const LITRES_PER_M3 = 1000
const GRAMS_PER_KG = 1000

export const mediaWeightEquation: Equation = {
  text: 'weight (kg) = loose density (kg/m³) × volume (L) / 1000',
  validFor: 'dry, loosely poured media; wet media weighs more',
  sourceKeys: ['house-rule'],
}

/** kg of a volume in L at a density in kg/m³. */
export const weightKg = (litres: number, densityKgPerM3: number) => (litres * densityKgPerM3) / LITRES_PER_M3
/** L of a weight in kg at a density in kg/m³. */
export const volumeL = (kilograms: number, densityKgPerM3: number) =>
  (kilograms * LITRES_PER_M3) / densityKgPerM3
/** kg/m³ of what was measured. */
export const bulkDensityKgPerM3 = (litres: number, kilograms: number) => (kilograms * LITRES_PER_M3) / litres
/** kg of one cubic foot. */
export const cubicFootKg = (densityKgPerM3: number) => weightKg(litresPerCubicFoot, densityKgPerM3)

/** Lightest and heaviest that a volume should weigh, kg. null: nobody says. */
export function expectedWeightKg(material: MediaMaterial, litres: number): Range | null {
  const range = material.densityKgPerM3
  return range && [weightKg(litres, range[0]), weightKg(litres, range[1])]
}

/** Smallest and largest volume that a weight should fill, L. null: nobody says. */
export function expectedVolumeL(material: MediaMaterial, kilograms: number): Range | null {
  const range = material.densityKgPerM3
  return range && [volumeL(kilograms, range[1]), volumeL(kilograms, range[0])]
}

export interface StatedWeight {
  /** `unknown`: we hold no figure for the material. */
  verdict: 'fits' | 'caution' | 'unknown'
  expectedKg: Range | null
  saying: string | null
}

const both = (kilograms: number) =>
  `${printMass(kilograms * GRAMS_PER_KG, 'us')} (${printMass(kilograms * GRAMS_PER_KG, 'metric')})`

/** Whether a stated weight can be that volume of the material. Outside the range is a question, never a refusal. */
export function judgeStatedWeight(
  material: MediaMaterial,
  stated: { litres: number; weightKg: number },
): StatedWeight {
  const expectedKg = expectedWeightKg(material, stated.litres)
  if (!expectedKg) return { verdict: 'unknown', expectedKg: null, saying: null }
  const [least, most] = expectedKg
  // A kitchen scale and a filled bag are not exact: half a per cent over the edge is no question.
  if (stated.weightKg >= least * 0.995 && stated.weightKg <= most * 1.005) {
    return { verdict: 'fits', expectedKg, saying: null }
  }
  const why = stated.weightKg > most ? 'Is it wet, or is the volume larger?' : 'Is the volume smaller?'
  return {
    verdict: 'caution',
    expectedKg,
    saying: `${material.name}: dry, that volume usually weighs ${both(least)} to ${both(most)}. ${why}`,
  }
}

/** What a number of units weighs in the car, both systems: '4 bags weigh about 118 lb (53.4 kg) in the car.' */
export function carLoadWords(units: number, unitWeightKg: number): string {
  const total = units * unitWeightKg
  const noun = units === 1 ? 'unit weighs' : 'units weigh'
  return `${roundTo(units, 1).toLocaleString('en-US')} ${noun} about ${both(total)} in the car.`
}
