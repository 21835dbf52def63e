import { categories } from '@/shared/contracts/search'

export type Category = (typeof categories)[number]

// Stored in listing_search.category: an order that is kept for ever.
const codes: Record<Category, number> = { fish: 1, worms: 2, media: 3, produce: 4 }

export const categoryCodes: readonly number[] = Object.values(codes)

export const categoryCode = (category: Category): number => codes[category]

/** null: no such code. */
export function categoryOfCode(code: number): Category | null {
  return categories.find((category) => codes[category] === code) ?? null
}
