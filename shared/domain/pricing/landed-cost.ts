import { roundHalfUp } from '@/shared/domain/money/round-half-up'

/**
 * Everything the buyer pays (goods, box, freight, tax), per animal expected alive, half up to the cent.
 * null: nothing to share it among.
 */
export function landedCentsEach(totalCents: number, aliveCount: number): number | null {
  return Number.isInteger(aliveCount) && aliveCount > 0 ? roundHalfUp(totalCents, aliveCount) : null
}
