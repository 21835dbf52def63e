const NO2_PER_N = 3.2844
const CHLORIDE_IN_SALT = 0.607
const CHLORIDE_PER_NO2 = 10

interface NitriteWater {
  nitriteMgNPerL: number
  chlorideMgPerL: number
}

/**
 * Plain salt to add, mg NaCl per L, for chloride : NO2 of 10 : 1 by weight (SRAC 462; read as NO2, the cautious way).
 * 0: enough chloride is there. null: a figure below zero or unreadable.
 */
export function saltForNitriteMgPerL({ nitriteMgNPerL, chlorideMgPerL }: NitriteWater): number | null {
  if (!(nitriteMgNPerL >= 0 && chlorideMgPerL >= 0)) return null
  const missing = CHLORIDE_PER_NO2 * nitriteMgNPerL * NO2_PER_N - chlorideMgPerL
  return missing > 0 ? missing / CHLORIDE_IN_SALT : 0
}
