// Acklam's rational approximation (from memory), relative error below 1.2e-9; a test holds it against the integral.
const near = [
  -39.69683028665376, 220.9460984245205, -275.9285104469687, 138.357751867269, -30.66479806614716,
  2.506628277459239,
]
const nearUnder = [
  -54.47609879822406, 161.5858368580409, -155.6989798598866, 66.80131188771972, -13.28068155288572, 1,
]
const far = [
  -0.007784894002430293, -0.3223964580411365, -2.400758277161838, -2.549732539343734, 4.374664141464968,
  2.938163982698783,
]
const farUnder = [0.007784695709041462, 0.3224671290700398, 2.445134137142996, 3.754408661907416, 1]
const FAR_P = 0.02425

const polynomial = (terms: readonly number[], x: number) => terms.reduce((sum, term) => sum * x + term, 0)

/** Standard normal quantile: chance below → standard deviations from the mean. null unless between 0 and 1. */
export function normalQuantile(chance: number): number | null {
  if (!(chance > 0 && chance < 1)) return null
  if (chance > 0.5) {
    const mirrored = normalQuantile(1 - chance)
    return mirrored === null ? null : -mirrored
  }
  if (chance < FAR_P) {
    const q = Math.sqrt(-2 * Math.log(chance))
    return polynomial(far, q) / polynomial(farUnder, q)
  }
  const q = chance - 0.5
  return (q * polynomial(near, q * q)) / polynomial(nearUnder, q * q)
}

/** Standard normal chance of a value below `z`, by continued terms; good to 1e-7. */
export function normalChance(z: number): number {
  // Abramowitz & Stegun 7.1.26 (from memory).
  const x = Math.abs(z) / Math.SQRT2
  const t = 1 / (1 + 0.3275911 * x)
  const tail =
    polynomial([1.061405429, -1.453152027, 1.421413741, -0.284496736, 0.254829592, 0], t) * Math.exp(-x * x)
  return z < 0 ? tail / 2 : 1 - tail / 2
}
