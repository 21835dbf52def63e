import { parseQuantity } from '@/shared/units/parse-quantity'

const countWords = ['', 'fish', 'worms', 'worm', 'each', 'ea', 'pcs', 'heads', 'head', 'bunches', 'bunch']

/** Whole number with thousands commas: 1200 → '1,200'. */
export function printCount(count: number): string {
  return Math.round(count).toLocaleString('en-US')
}

/** Whole count from '1,200' or '20 fish'. null: not readable, a fraction, or past what a count can be (1e9). */
export function parseCount(text: string): number | null {
  const quantity = parseQuantity(text)
  if (!quantity || !countWords.includes(quantity.unit)) return null
  return Number.isInteger(quantity.value) && quantity.value <= 1e9 ? quantity.value : null
}
