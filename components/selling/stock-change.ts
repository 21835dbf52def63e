import type { StockChange } from '@/hooks/use-own-listings'
import { parseCount } from '@/shared/units/count'

export type StockReason = StockChange['reason']

interface ReasonWords {
  label: string
  hint: string
  /** What the number means that is asked for. */
  ask: string
  sign: -1 | 1 | 'total'
}

export const stockReasons: Record<StockReason, ReasonWords> = {
  'die-off': {
    label: 'Fish died',
    hint: 'Buyers of this batch see the losses you state.',
    ask: 'How many died?',
    sign: -1,
  },
  regraded: {
    label: 'Moved to another grade',
    hint: 'Too small or too large for this batch.',
    ask: 'How many were moved?',
    sign: -1,
  },
  'used-here': {
    label: 'Kept for yourself',
    hint: 'Breeders, or your own tanks.',
    ask: 'How many do you keep?',
    sign: -1,
  },
  'more-ready': {
    label: 'More are ready',
    hint: 'Of the same batch and size.',
    ask: 'How many more?',
    sign: 1,
  },
  recount: {
    label: 'Counted again',
    hint: 'The count was off.',
    ask: 'How many are free now?',
    sign: 'total',
  },
}

/** By how much the free count changes. null: not a number, or no change. */
export function stockChange(reason: StockReason, typed: string, free: number): number | null {
  const count = parseCount(typed)
  if (count === null) return null
  const { sign } = stockReasons[reason]
  const change = sign === 'total' ? count - free : sign * count
  return change === 0 ? null : change
}
