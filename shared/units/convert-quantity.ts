import { parseQuantity } from '@/shared/units/parse-quantity'

/** Reads a quantity in any unit of the table (unit as typed → size in the inside unit). null: not readable. */
export function convertQuantity(
  text: string,
  sizes: Record<string, number>,
  bareUnit: string,
): number | null {
  const quantity = parseQuantity(text)
  if (!quantity) return null
  const unit = quantity.unit === '' ? bareUnit : quantity.unit
  const size = Object.hasOwn(sizes, unit) ? sizes[unit] : undefined
  return size === undefined ? null : quantity.value * size
}
