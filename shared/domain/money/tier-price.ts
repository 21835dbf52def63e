/** From this count on, one animal costs this. */
export interface PriceTier {
  fromCount: number
  unitCents: number
}

/** The tier a quantity buys at. null: below the first tier. Tiers in rising count, as `areTiersFalling` wants them. */
export function tierFor(tiers: readonly PriceTier[], quantity: number): PriceTier | null {
  return tiers.findLast((tier) => tier.fromCount <= quantity) ?? null
}

/** How many more reach the next, cheaper tier. null: none is left. */
export function nextTier(
  tiers: readonly PriceTier[],
  quantity: number,
): (PriceTier & { missing: number }) | null {
  const next = tiers.find((tier) => tier.fromCount > quantity)
  return next ? { ...next, missing: next.fromCount - quantity } : null
}

/** Whether counts rise and prices fall, strictly, and every figure is a whole number of at least 1. */
export function areTiersFalling(tiers: readonly PriceTier[]): boolean {
  return tiers.every(({ fromCount, unitCents }, at) => {
    const before = tiers[at - 1]
    const isWhole =
      Number.isInteger(fromCount) && Number.isInteger(unitCents) && fromCount >= 1 && unitCents >= 1
    return isWhole && (!before || (before.fromCount < fromCount && before.unitCents > unitCents))
  })
}
