import { convertQuantity } from '@/shared/units/convert-quantity'
import { parseQuantity } from '@/shared/units/parse-quantity'
import { roundTo } from '@/shared/units/round-to'
import type { UnitSystem } from '@/shared/units/unit-system'

const cmPerInch = 2.54
const cmIn: Record<string, number> = {
  mm: 0.1,
  cm: 1,
  m: 100,
  in: cmPerInch,
  inch: cmPerInch,
  inches: cmPerInch,
  '"': cmPerInch,
  '”': cmPerInch,
  ft: 30.48,
  feet: 30.48,
}
const quarterSigns = ['', '¼', '½', '¾']

export interface LengthRangeCm {
  minCm: number
  maxCm: number
}

/** Inches → cm (2.54 exact). */
export const cmFromInches = (inches: number) => inches * cmPerInch
/** cm → inches (2.54 exact). */
export const inchesFromCm = (cm: number) => cm / cmPerInch
/** Batches are graded in quarter inches: the nearest whole number of them. */
export const quarterInchesFromCm = (cm: number) => roundTo(cm / (cmPerInch / 4), 1)
/** Whole quarter inches → cm. */
export const cmFromQuarterInches = (quarters: number) => (quarters * cmPerInch) / 4

/** '2 1/4 in', '6 cm', '60 mm' → cm; a bare number is read in `units` (in or cm). null: not readable. */
export function parseLengthCm(text: string, units: UnitSystem): number | null {
  return convertQuantity(text, cmIn, units === 'us' ? 'in' : 'cm')
}

/** '3-4in', '3 to 4 in', '2 1/4 – 3 in', '6 cm' → both ends in cm. null: not readable or upside down. */
export function parseLengthRangeCm(text: string, units: UnitSystem): LengthRangeCm | null {
  const whole = parseLengthCm(text, units)
  if (whole !== null) return { minCm: whole, maxCm: whole }
  for (const [from, to] of splits(text)) {
    const unit = parseQuantity(to)?.unit ?? ''
    const low = parseLengthCm(parseQuantity(from)?.unit ? from : `${from} ${unit}`, units)
    const high = parseLengthCm(to, units)
    if (low !== null && high !== null && low <= high) return { minCm: low, maxCm: high }
  }
  return null
}

/** Nearest quarter inch ('2¼ in') or half centimetre ('6.5 cm'). */
export function printLength(cm: number, units: UnitSystem): string {
  return units === 'us' ? `${quarterText(cm)} in` : `${roundTo(cm, 0.5)} cm`
}

/** '3–4 in'; one figure when both ends print alike. */
export function printLengthRange({ minCm, maxCm }: LengthRangeCm, units: UnitSystem): string {
  const [low, high] = [printLength(minCm, units), printLength(maxCm, units)]
  return low === high ? high : `${low.replace(/ (in|cm)$/, '')}–${high}`
}

function quarterText(cm: number): string {
  const quarters = quarterInchesFromCm(cm)
  const whole = Math.floor(quarters / 4)
  const part = quarterSigns[quarters % 4] ?? ''
  return whole === 0 && part ? part : `${whole}${part}`
}

function splits(text: string): [string, string][] {
  return [...text.matchAll(/\s+to\s+|\s*[-–—]\s*/gi)].map((cut) => [
    text.slice(0, cut.index),
    text.slice(cut.index + cut[0].length),
  ])
}
