/** The processor's own time: real time plus an offset, so that a lapse can be watched without waiting a week. */
export class Clock {
  constructor(private offsetMs: number) {}

  nowS(): number {
    return Math.floor((Date.now() + this.offsetMs) / 1000)
  }

  offset(): number {
    return this.offsetMs
  }

  setOffset(ms: number): void {
    this.offsetMs = ms
  }
}
