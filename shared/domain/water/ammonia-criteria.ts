interface CriteriaWater {
  waterC: number
  pH: number
  /** Whether trout or salmon live in the water. */
  trout: boolean
}

interface AmmoniaCriteria {
  /** Not above this for one hour in three years. */
  acuteMgTanPerL: number
  /** Not above this as a thirty-day mean. */
  chronicMgTanPerL: number
}

/** EPA 822-R-13-001 (2013), total ammonia nitrogen. null outside pH 6.5-9.0 or 0-30 °C. */
export function ammoniaCriteria({ waterC, pH, trout }: CriteriaWater): AmmoniaCriteria | null {
  if (!(pH >= 6.5 && pH <= 9 && waterC >= 0 && waterC <= 30)) return null
  const acid = 1 / (1 + 10 ** (7.204 - pH))
  const base = 1 / (1 + 10 ** (pH - 7.204))
  const mussels = 23.12 * 10 ** (0.036 * (20 - waterC))
  const shared = 0.7249 * (0.0114 * acid + 1.6181 * base)
  const acuteMgTanPerL = trout
    ? Math.min(0.275 * acid + 39 * base, shared * mussels)
    : shared * Math.min(51.93, mussels)
  const chronicShape = 0.0278 / (1 + 10 ** (7.688 - pH)) + 1.1994 / (1 + 10 ** (pH - 7.688))
  const chronicMgTanPerL = 0.8876 * chronicShape * 2.126 * 10 ** (0.028 * (20 - Math.max(waterC, 7)))
  return { acuteMgTanPerL, chronicMgTanPerL }
}
