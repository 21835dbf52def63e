import { parseQuantity } from '@/shared/units/parse-quantity'
import { parseMassG } from '@/shared/units/mass'

export type NetWeight = { netG: number } | { fault: string }

/** A net weight as typed, always with its unit: '8 oz' and '250 g' are read, a bare '8' is asked about. */
export function readNetWeight(text: string): NetWeight {
  const quantity = parseQuantity(text)
  if (!quantity || quantity.value <= 0)
    return { fault: 'Give a net weight with its unit, like 8 oz or 250 g.' }
  if (quantity.unit === '') {
    const typed = text.trim()
    return { fault: `${typed} what? Write the unit too: ${typed} oz, ${typed} lb or ${typed} g.` }
  }
  const netG = parseMassG(text, 'us')
  return netG === null ? { fault: `"${quantity.unit}" is not a weight. Use oz, lb, g or kg.` } : { netG }
}
