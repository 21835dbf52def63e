export const faultKinds = ['cut', 'fail', 'lost-reply', 'rate-limit', 'slow', 'slow-reply'] as const

/**
 * `cut`: the line breaks before anything is done. `fail`: 500, nothing done. `rate-limit`: 429. `slow`: waits, then
 * does it. `slow-reply`: does it, then waits. `lost-reply`: does it, then the line breaks.
 */
export interface Fault {
  kind: (typeof faultKinds)[number]
  /** `POST /v1/refunds`: only calls that begin so. Empty: every call. */
  match: string
  times: number
  ms: number
}

/** Faults planted for coming API calls, used up one by one. */
export class Faults {
  private planted: Fault[] = []

  plant(fault: Fault): void {
    this.planted.push({ ...fault })
  }

  clear(): void {
    this.planted = []
  }

  takeFor(method: string, path: string): Fault | null {
    const found = this.planted.find((fault) => `${method} ${path}`.startsWith(fault.match))
    if (!found) return null
    found.times -= 1
    this.planted = this.planted.filter((fault) => fault.times > 0)
    return found
  }
}
