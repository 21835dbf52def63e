interface WaterSample {
  waterC: number
  pH: number
}

/** Acid constant of ammonium in fresh water, 0 to 50 °C: Emerson et al. 1975. null outside. */
export function ammoniaPKa(waterC: number): number | null {
  return waterC >= 0 && waterC <= 50 ? 0.09018 + 2729.92 / (waterC + 273.15) : null
}

/** Share of total ammonia that is un-ionised (0 to 1), Emerson et al. 1975. null outside 0-50 °C or pH 3-12. */
export function ammoniaFraction({ waterC, pH }: WaterSample): number | null {
  const pKa = ammoniaPKa(waterC)
  if (pKa === null || !(pH >= 3 && pH <= 12)) return null
  return 1 / (1 + 10 ** (pKa - pH))
}
