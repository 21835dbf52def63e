/**
 * Domain time: real time plus an offset (`npm start -- --date 2027-01-15`), so that the demo can be run at any
 * date. Sessions, second factors, signatures, key expiry and logs keep real time and do not use this.
 */
let offsetMs = 0

export function setClockOffset(ms: number): void {
  offsetMs = ms
}

export function now(): Date {
  return new Date(Date.now() + offsetMs)
}
