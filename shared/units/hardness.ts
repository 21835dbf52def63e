import { readNumber } from '@/shared/units/read-number'

/** One German degree of hardness in ppm as CaCO3: 10 mg CaO a litre; molar masses from memory. */
const PPM_A_DEGREE = (10 * 100.087) / 56.077

const shape = /^([\d.,\s/¼½¾⅛⅜⅝⅞]+?)\s*(ppm|mg\/l|°?\s*d?kh|°?\s*dh|degrees?|°)?$/

/** '100', '100 ppm', '100 mg/L', '6 dKH' → ppm as CaCO3; a bare number is ppm. null: not readable. */
export function parseHardnessPpm(text: string): number | null {
  const parts = shape.exec(text.trim().toLowerCase())
  const size = parts && readNumber(parts[1] ?? '')
  if (!parts || size === null) return null
  const isPpm = !parts[2] || parts[2] === 'ppm' || parts[2] === 'mg/l'
  return isPpm ? size : size * PPM_A_DEGREE
}
