import { printDate, printDateOfYear } from '@/shared/domain/calendar/print-date'
import { clockMs } from '@/shared/domain/orders/clocks.facts'
import { faultWords } from '@/shared/domain/shipping/fault-words'
import type { JudgedShipDay } from '@/shared/domain/shipping/ship-days'

const HOUR_MS = 3_600_000

export interface DispatchCheck {
  verdict: 'safe' | 'unsafe' | 'unknown'
  atMs: number
  /** Whether it says how the boxes are packed. */
  isPackingKnown: boolean
  /** Why it is not safe, in sentences. */
  reasons: readonly string[]
}

export interface DispatchFacts {
  /** The animals are counted and waiting. */
  isReady: boolean
  isBalanceCaptured: boolean
  papersNeeded: readonly string[]
  papers: readonly { kind: string; expiresOn: string }[]
  /** The day agreed, and the day on which it arrives. */
  shipDay: string
  arriveDay: string
  /** Today by the seller's calendar, judged as a ship day. */
  today: JudgedShipDay
  /** The latest check that was made for the agreed day. null: none was. */
  check: DispatchCheck | null
  nowMs: number
  ticksNeeded: readonly string[]
  ticks: readonly string[]
}

export interface DispatchFault {
  code:
    | 'not-ready'
    | 'balance-unpaid'
    | 'paper-missing'
    | 'paper-expired'
    | 'check-missing'
    | 'check-old'
    | 'check-not-safe'
    | 'packing-open'
    | 'day-not-agreed'
    | 'day-not-lawful'
    | 'tick-missing'
  /** Which part of the order or of the form is at fault, as a JSON pointer. */
  pointer: string
  /** A sentence to act on. */
  detail: string
}

const FRESH_MS = clockMs('temperatureSnapshot', 'fish')

/** Everything that forbids handing the box to the carrier now, all at once. Empty: it may leave. */
export function judgeDispatch(facts: DispatchFacts): DispatchFault[] {
  return [
    ...readyFaults(facts),
    ...balanceFaults(facts),
    ...paperFaults(facts),
    ...checkFaults(facts),
    ...dayFaults(facts),
    ...tickFaults(facts),
  ]
}

function readyFaults({ isReady }: DispatchFacts): DispatchFault[] {
  if (isReady) return []
  const detail = 'Mark the order ready first: the animals are counted and waiting.'
  return [{ code: 'not-ready', pointer: '#/state', detail }]
}

function balanceFaults({ isBalanceCaptured }: DispatchFacts): DispatchFault[] {
  if (isBalanceCaptured) return []
  const detail = 'The buyer has not paid the balance yet. Shipped orders are paid before they leave.'
  return [{ code: 'balance-unpaid', pointer: '#/balance', detail }]
}

/** A paper asked for and not named; and any paper named that is over before the box arrives, unless renewed. */
function paperFaults({ papersNeeded, papers, arriveDay }: DispatchFacts): DispatchFault[] {
  const kinds = [...new Set([...papersNeeded, ...papers.map(({ kind }) => kind)])]
  return kinds.flatMap((kind): DispatchFault[] => {
    const named = papers.filter((paper) => paper.kind === kind)
    if (named.some(({ expiresOn }) => expiresOn >= arriveDay)) return []
    const last = named
      .map(({ expiresOn }) => expiresOn)
      .sort()
      .at(-1)
    if (last === undefined) {
      const detail = `This way needs a paper that is not named yet: ${kind}.`
      return [{ code: 'paper-missing', pointer: '#/papers', detail }]
    }
    const detail = `${kind} expires on ${printDateOfYear(last)}, before the box arrives on ${printDate(arriveDay)}.`
    return [{ code: 'paper-expired', pointer: '#/papers', detail }]
  })
}

function checkFaults({ check, shipDay, nowMs }: DispatchFacts): DispatchFault[] {
  const pointer = '#/check'
  if (check === null) {
    const detail = `The way has not been looked at for ${printDate(shipDay)}. Look again now.`
    return [{ code: 'check-missing', pointer, detail }]
  }
  const faults: DispatchFault[] = []
  if (check.verdict !== 'safe') {
    const said = check.verdict === 'unsafe' ? 'The way is not safe.' : 'Nobody can say that the way is safe.'
    faults.push({ code: 'check-not-safe', pointer, detail: [said, ...check.reasons].join(' ') })
  }
  if (check.verdict === 'safe' && !check.isPackingKnown) {
    const detail =
      'The forecast did not answer, and without it nobody knows how to pack. Look at the way once more.'
    faults.push({ code: 'packing-open', pointer, detail })
  }
  const ageMs = nowMs - check.atMs
  if (ageMs > FRESH_MS) {
    const [hours, most] = [Math.floor(ageMs / HOUR_MS), FRESH_MS / HOUR_MS]
    const detail = `The last look at the way is ${hours} hours old; it counts for ${most}. Look again now.`
    faults.push({ code: 'check-old', pointer, detail })
  }
  return faults
}

function dayFaults({ today, shipDay }: DispatchFacts): DispatchFault[] {
  const pointer = '#/shipDay'
  const agreed: DispatchFault[] =
    today.shipDay === shipDay
      ? []
      : [
          {
            code: 'day-not-agreed',
            pointer,
            detail: `The day agreed is ${printDate(shipDay)}; today is ${printDate(today.shipDay)}.`,
          },
        ]
  const lawful = today.faults.map((fault): DispatchFault => {
    return { code: 'day-not-lawful', pointer, detail: faultWords(fault) }
  })
  return [...agreed, ...lawful]
}

function tickFaults({ ticksNeeded, ticks }: DispatchFacts): DispatchFault[] {
  return ticksNeeded
    .filter((tick) => !ticks.includes(tick))
    .map((tick) => ({
      code: 'tick-missing',
      pointer: `#/ticks/${tick}`,
      detail: 'Please read and tick this too.',
    }))
}
