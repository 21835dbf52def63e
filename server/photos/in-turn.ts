import { Problem } from '@/shared/api/problem'

const AT_ONCE = 2
const MOST_WAITING = 20

let running = 0
const waiting: (() => void)[] = []

/** Decoding a photo takes a core and some 50 MB: two at once, a few in line, and the rest are asked to come again. */
export async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) {
    if (waiting.length >= MOST_WAITING)
      throw new Problem('try-again', 'Many photos at once. Try again shortly.')
    await new Promise<void>((mayGo) => waiting.push(mayGo))
  }
  running++
  try {
    return await work()
  } finally {
    running--
    waiting.shift()?.()
  }
}
