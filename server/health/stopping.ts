let stopping = false

/** Said once, on the way out: whoever spreads requests over servers sends no more here. */
export function noteStopping(): void {
  stopping = true
}

export function isStopping(): boolean {
  return stopping
}
