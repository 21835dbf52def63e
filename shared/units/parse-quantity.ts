import { readNumber } from '@/shared/units/read-number'

export interface Quantity {
  value: number
  /** Unit as typed, lower case, without dots and degree sign; '' when only a number was typed. */
  unit: string
}

const shape = /^([\d.,/¼½¾⅛⅜⅝⅞\s-]*[\d¼½¾⅛⅜⅝⅞])\s*(.*)$/u

/** Splits '2 1/4 in', '1,200 fish', '75gal' into number and unit. null: no leading number, or a sign. */
export function parseQuantity(text: string): Quantity | null {
  const tidy = text.trim().toLowerCase()
  if (tidy.startsWith('-')) return null
  const parts = shape.exec(tidy)
  if (!parts) return null
  const value = readNumber(parts[1] ?? '')
  return value === null
    ? null
    : { value, unit: (parts[2] ?? '').replace(/[°.]/g, '').replace(/\s+/g, ' ').trim() }
}
