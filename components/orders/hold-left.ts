interface Hold {
  endsAtMs: number
  /** What the server's clock said in its answer, and what this device's clock said when the answer came. */
  asOfMs: number
  receivedAtMs: number
}

/** Whole seconds left of a hold by the server's clock, however wrong this device's may be. */
export function holdLeftS({ endsAtMs, asOfMs, receivedAtMs }: Hold, nowMs: number): number {
  return Math.max(0, Math.round((endsAtMs - asOfMs - (nowMs - receivedAtMs)) / 1000))
}
