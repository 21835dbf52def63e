import { setClockOffset } from '@/server/clock'

/** One act of the demo at its moment of domain time. */
export interface Step {
  at: Date
  what: string
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

/**
 * Plays all steps in the order of their time, each with the clock at its moment: rows get the times, and the numbers,
 * they would have got. A step that fails ends the demo, with its name.
 */
export async function playTimeline(steps: readonly Step[]): Promise<void> {
  for (const step of steps.toSorted((one, other) => one.at.getTime() - other.at.getTime())) {
    turnClockTo(step.at)
    try {
      await step.run()
    } catch (error) {
      throw new Error(`the demo could not go on at "${step.what}" (${step.at.toISOString()})`, {
        cause: error,
      })
    }
  }
}
