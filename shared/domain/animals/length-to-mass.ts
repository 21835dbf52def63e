import { catfishTable } from '@/shared/domain/species/catfish-table.facts'
import type { Equation } from '@/shared/domain/equation'
import type { SpeciesRecord, StandardWeight } from '@/shared/domain/species/species-record'
import { gramsPerPound } from '@/shared/units/mass'

export const lengthToMassEquation: Equation = {
  text: 'W(g) = K · L(cm)³ / 100; C (lb, in) = 36.13 · K (g, mm); standard weight log10 W = a + b·x + c·x², x = log10 mm',
  validFor: 'total length; standard weights from the least length of each row, wild fish in good condition',
  sourceKeys: ['piper-1982', 'fsa-wslit', 'alabama-catfish'],
}

/** Mass, g, by Fulton's factor; length in cm, total. null for lengths that are not above zero. */
export function fultonMassG(fultonK: number, lengthCm: number): number | null {
  return fultonK > 0 && lengthCm > 0 ? (fultonK * lengthCm ** 3) / 100 : null
}

/** Piper's C (W in lb = C · L in inches cubed) → Fulton's factor: C = 36.13 · K(g, mm), Fulton = K(g, mm) · 100,000. */
export function fultonOfPiperC(piperC: number): number {
  return (piperC / 36.13) * 1e5
}

/** Standard weight, g, total length in mm. null outside the row's lengths. */
export function standardWeightG(row: StandardWeight, lengthMm: number): number | null {
  if (!(lengthMm >= row.leastMm && lengthMm <= (row.mostMm ?? 2000))) return null
  const x = Math.log10(lengthMm)
  return 10 ** (row.a + row.b * x + row.c * x ** 2)
}

/** Mass, g, of channel catfish by the hatchery table; between whole inches by the straight line of the logarithms. null outside 1-10 in. */
export function catfishTableMassG(lengthIn: number): number | null {
  const above = catfishTable.findIndex((row) => row.inches >= lengthIn)
  const upper = catfishTable[above]
  if (!upper || !(lengthIn >= 1)) return null
  const lower = catfishTable[above - 1]
  if (!lower || upper.inches === lengthIn) return gramsOf(upper.lbPer1000)
  const share = Math.log(lengthIn / lower.inches) / Math.log(upper.inches / lower.inches)
  return gramsOf(lower.lbPer1000 * (upper.lbPer1000 / lower.lbPer1000) ** share)
}

const gramsOf = (poundsPer1000: number) => (poundsPer1000 * gramsPerPound) / 1000

/**
 * Mass of one animal to plan a load by, g: the heaviest that Fulton's factor, the standard weight and the catfish table
 * say. null where the species has no length-mass rule (crustaceans, worms) or the length is not above zero.
 */
export function massForLoadG(species: SpeciesRecord, lengthMm: number): number | null {
  const { lengthWeight, standardWeight } = species
  const said = [
    lengthWeight && fultonMassG(lengthWeight.fultonK, lengthMm / 10),
    standardWeight && standardWeightG(standardWeight, lengthMm),
    species.id === 'channel_catfish' ? catfishTableMassG(lengthMm / 25.4) : null,
  ].filter((mass) => mass !== null)
  return said.length > 0 ? Math.max(...said) : null
}
