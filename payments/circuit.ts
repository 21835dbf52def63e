/** Calls in a row that got no answer before we stop asking. */
const OPENS_AFTER = 5
const REST_MS = 15_000

export interface Circuit {
  /** False while the processor is left in peace; the first caller after the rest is let through as the trial. */
  mayAsk: () => boolean
  answered: () => void
  unanswered: () => void
}

/**
 * Leaves a processor that does not answer alone for a while: without it, every effect in the queue waits out its own
 * time-out, and mails behind them wait too. Real time.
 */
export function makeCircuit(restMs = REST_MS, nowMs: () => number = Date.now): Circuit {
  let failures = 0
  let restsUntil = 0
  return {
    mayAsk: () => {
      if (failures < OPENS_AFTER) return true
      if (nowMs() < restsUntil) return false
      restsUntil = nowMs() + restMs
      return true
    },
    answered: () => {
      failures = 0
    },
    unanswered: () => {
      failures += 1
      restsUntil = nowMs() + restMs
    },
  }
}
