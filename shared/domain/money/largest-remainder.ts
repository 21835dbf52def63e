/**
 * Splits whole cents by whole weights so that the shares sum to the cent; leftover cents go to the largest
 * remainders, ties to whoever comes first. Throws RangeError when there is nothing to split by.
 */
export function largestRemainder(cents: number, weights: readonly number[]): number[] {
  const sum = weights.reduce((total, weight) => total + weight, 0)
  const isWhole = [cents, sum, ...weights].every((value) => Number.isSafeInteger(value) && value >= 0)
  if (!isWhole || sum === 0 || !Number.isSafeInteger(cents * sum)) {
    throw new RangeError(`cannot split ${cents} cents by ${weights.join(', ')}`)
  }
  const parts = weights.map((weight, at) => {
    const rest = (cents * weight) % sum
    return { at, rest, share: (cents * weight - rest) / sum }
  })
  const shares = parts.map((part) => part.share)
  const left = cents - shares.reduce((total, share) => total + share, 0)
  const served = [...parts].sort((one, other) => other.rest - one.rest || one.at - other.at).slice(0, left)
  for (const { at, share } of served) shares[at] = share + 1
  return shares
}
