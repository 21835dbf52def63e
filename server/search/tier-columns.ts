import type { SearchRow, SearchTier } from '@/server/search/search-row'

/** Largest value of the count columns; as a tier's first count it means "never". */
export const MOST_COUNT = 16_777_215
const COLUMN_TIERS = 4
export const MORE_TIERS = { most: 4, countDigits: 7, centsDigits: 8 } as const

/**
 * Orders up to this size are everyday ones; the walk by price serves them. Prices of fish first fall at a hundred or
 * so, of the rest after the first piece. Index: category code.
 */
const EVERYDAY_ORDER: readonly number[] = [0, 99, 1, 1, 1]

/** The largest count whose price the walk by price may be asked for. */
export const everydayOrder = (categoryCode: number): number => EVERYDAY_ORDER[categoryCode] ?? 1

/** Cents for one at that count. The first tier also covers smaller counts. */
export function unitCentsAt(tiers: readonly SearchTier[], count: number): number {
  let cents = tiers[0]?.unitCents ?? 0
  for (const tier of tiers) if (tier.fromCount <= count) cents = tier.unitCents
  return cents
}

// The largest count that fits the digits.
const NEVER = 10 ** MORE_TIERS.countDigits - 1

const digits = (value: number, width: number) => String(value).padStart(width, '0')

/** A row's prices as the table holds them. */
export function tierColumns({ categoryCode, minQty, tiers }: SearchRow) {
  const spare = tiers.length - COLUMN_TIERS - MORE_TIERS.most
  if (tiers.length === 0 || spare > 0)
    throw new RangeError(`A listing has 1 to 8 prices, not ${tiers.length}`)
  const at = (index: number) => tiers[index] ?? { fromCount: MOST_COUNT, unitCents: 0 }
  const more =
    tiers.length > COLUMN_TIERS ? Array.from({ length: MORE_TIERS.most }, (_, i) => at(COLUMN_TIERS + i)) : []
  return {
    price1: at(0).unitCents,
    from2: at(1).fromCount,
    price2: at(1).unitCents,
    from3: at(2).fromCount,
    price3: at(2).unitCents,
    from4: at(3).fromCount,
    price4: at(3).unitCents,
    moreTiers: more
      .map(
        (tier) =>
          digits(Math.min(tier.fromCount, NEVER), MORE_TIERS.countDigits) +
          digits(tier.unitCents, MORE_TIERS.centsDigits),
      )
      .join(''),
    smallPrice: unitCentsAt(tiers, Math.max(everydayOrder(categoryCode), minQty)),
  }
}
