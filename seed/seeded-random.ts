import { createHash } from 'node:crypto'

export interface Chance {
  /** 0 to just under 1. */
  next: () => number
  between: (low: number, high: number) => number
  /** Whole numbers, both ends included. */
  whole: (low: number, high: number) => number
  pick: <T>(from: readonly T[]) => T
  happens: (probability: number) => boolean
}

/** The same words give the same chances: a demo that is built twice is the same demo. */
export function seededRandom(words: string): Chance {
  let state = createHash('sha256').update(`chance:${words}`).digest().readUInt32LE(0)
  // mulberry32 by Tommy Ettinger (public domain), from memory.
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
  const whole = (low: number, high: number) => low + Math.floor(next() * (high - low + 1))
  return {
    next,
    whole,
    between: (low, high) => low + next() * (high - low),
    pick: <T>(from: readonly T[]): T => {
      const taken = from[whole(0, from.length - 1)]
      if (taken === undefined) throw new RangeError('nothing to pick from')
      return taken
    },
    happens: (probability) => next() < probability,
  }
}
