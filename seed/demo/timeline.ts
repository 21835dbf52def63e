import { setClockOffset } from '@/server/clock'
import { Problem } from '@/shared/api/problem'

/** One act of the demo at its moment of domain time. */
export interface Step {
  at: Date
  what: string
  /** The listing or order whose story this is a part of. */
  story: string
  run: () => Promise<void>
}

export const MINUTE_MS = 60_000
export const HOUR_MS = 60 * MINUTE_MS
export const DAY_MS = 24 * HOUR_MS

export const after = (at: Date, ms: number): Date => new Date(at.getTime() + ms)

/** Turns the clock of this process to that moment, from which it goes on. */
export function turnClockTo(at: Date): void {
  setClockOffset(at.getTime() - Date.now())
}

/** One story in so many may break off before the demo counts as broken. */
const MOST_BROKEN_SHARE = 0.1

/**
 * Plays all steps in the order of their time, each with the clock at its moment: rows get the times, and the numbers,
 * they would have got. A story whose step the product refuses breaks off there, and the rest goes on without it: better
 * a demo with a gap than none on that date. Returns what broke off; too much of it, or a fault, ends the demo.
 */
export async function playTimeline(steps: readonly Step[]): Promise<string[]> {
  const most = new Set(steps.map((step) => step.story)).size * MOST_BROKEN_SHARE
  const broken = new Map<string, string>()
  for (const step of steps.toSorted((one, other) => one.at.getTime() - other.at.getTime())) {
    if (broken.has(step.story)) continue
    turnClockTo(step.at)
    try {
      await step.run()
    } catch (error) {
      const where = `${step.story}, ${step.what} (${step.at.toISOString()})`
      broken.set(step.story, `${where}: ${error instanceof Error ? error.message : String(error)}`)
      if (!(error instanceof Problem) || broken.size > most) {
        throw new Error(`the demo could not go on at ${where}`, { cause: error })
      }
    }
  }
  return [...broken.values()]
}
