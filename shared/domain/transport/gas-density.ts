/** Pure oxygen gas at one atmosphere, g per L. null outside 0-40 °C. */
export function oxygenGasGPerL(waterC: number): number | null {
  return waterC >= 0 && waterC <= 40 ? 31.998 / (0.082057 * (waterC + 273.15)) : null
}
