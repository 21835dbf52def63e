/**
 * numerator / denominator, half up, exact: whole numbers only, no floating point in between. Throws RangeError for
 * negatives, fractions, a zero denominator, or products past 2^53.
 */
export function roundHalfUp(numerator: number, denominator: number): number {
  if (
    !Number.isSafeInteger(numerator) ||
    !Number.isSafeInteger(denominator) ||
    numerator < 0 ||
    denominator <= 0
  ) {
    throw new RangeError(`cannot round ${numerator} / ${denominator}`)
  }
  const rest = numerator % denominator
  return (numerator - rest) / denominator + (rest >= denominator - rest ? 1 : 0)
}

/** A share in basis points (100 bp = 1 %) of whole cents, half up. */
export function shareOfCents(cents: number, basisPoints: number): number {
  return roundHalfUp(cents * basisPoints, 10_000)
}
