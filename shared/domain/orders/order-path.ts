import type { EdgeId } from '@/shared/domain/orders/edges.facts'
import {
  endWords,
  silenceWords,
  stepOf,
  stepWords,
  type PathStep,
} from '@/shared/domain/orders/order-path-words.facts'
import { whoseMove, type Move, type MoveFacts } from '@/shared/domain/orders/whose-move'
import type { CancelReason } from '@/shared/domain/orders/states.facts'

export interface PathFacts extends MoveFacts {
  reason?: CancelReason
  /** The seller is asked before the deposit is taken. */
  needsAcceptance: boolean
  isPooled: boolean
  clock: { atMs: number; edge: string } | null
  /** Of a box; absent where nobody said so. */
  hasArrived?: boolean
}

export interface OrderPath {
  steps: { step: PathStep; words: string; mark: 'done' | 'now' | 'ahead' }[]
  /** Who has to do what, for the reader of this screen. */
  move: Move
  untilMs: number | null
  /** What happens if nobody moves; '' when nothing does. */
  ifNobodyMoves: string
}

/** Where the order is, whose move it is, until when, and what happens if nobody moves. */
export function orderPath(facts: PathFacts): OrderPath {
  const line = stepsOf(facts)
  const here = facts.state === 'cancelled' ? -1 : line.indexOf(currentStep(facts))
  const end = facts.state === 'cancelled' && facts.reason ? endWords[facts.reason] : null
  const isOver = facts.state === 'settled' || facts.state === 'cancelled'
  // A moderator decides about a box that has not come, whenever that is: silence does nothing.
  const hasNoClock = isOver || isMissing(facts)
  return {
    steps: line.map((step, at) => ({
      step,
      words: stepWords[step],
      mark: markOf(at, here, facts.state === 'settled'),
    })),
    move: end === null ? whoseMove(facts) : { whose: 'nobody', words: asRead(end, facts.party) },
    untilMs: hasNoClock ? null : (facts.clock?.atMs ?? null),
    ifNobodyMoves: hasNoClock ? '' : (silenceWords[(facts.clock?.edge ?? '') as EdgeId] ?? ''),
  }
}

/** The one who did it reads "You". */
function asRead(words: string, party: PathFacts['party']): string {
  if (party === 'staff') return words
  return words.replace(new RegExp(`^The ${party}\\b`), 'You').replace(/^You was\b/, 'You were')
}

function stepsOf({ handOver, needsAcceptance, isPooled }: PathFacts): PathStep[] {
  return [
    'held',
    ...(isPooled ? (['pooled'] as const) : needsAcceptance ? (['asked'] as const) : []),
    'paid',
    'day',
    'ready',
    ...(handOver === 'ship' ? (['sent', 'arrived'] as const) : (['handed-over'] as const)),
    'settled',
  ]
}

const isMissing = ({ state, handOver, hasArrived = false }: PathFacts) =>
  state === 'claim_open' && handOver === 'ship' && !hasArrived

function currentStep(facts: PathFacts): PathStep {
  const { state, handOver } = facts
  if (isMissing(facts)) return 'sent'
  if (state === 'claim_open') return handOver === 'ship' ? 'arrived' : 'handed-over'
  return state === 'cancelled' ? 'held' : stepOf[state]
}

function markOf(at: number, here: number, isSettled: boolean): 'done' | 'now' | 'ahead' {
  if (at < here || (isSettled && at === here)) return 'done'
  return at === here ? 'now' : 'ahead'
}
