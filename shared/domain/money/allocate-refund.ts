export interface Charge {
  id: string
  purpose: 'deposit' | 'balance'
  chargedCents: number
  refundedCents: number
}

/**
 * Which card charges a refund goes back to: the balance first, then the deposit, each up to its unrefunded rest.
 * null: more than the charges still hold.
 */
export function allocateRefund(
  cents: number,
  charges: readonly Charge[],
): { id: string; cents: number }[] | null {
  const inOrder = [...charges].sort(
    (one, other) => Number(one.purpose === 'deposit') - Number(other.purpose === 'deposit'),
  )
  const parts: { id: string; cents: number }[] = []
  let left = cents
  for (const { id, chargedCents, refundedCents } of inOrder) {
    const part = Math.min(left, chargedCents - refundedCents)
    if (part > 0) parts.push({ id, cents: part })
    left -= Math.max(part, 0)
  }
  return left === 0 ? parts : null
}
