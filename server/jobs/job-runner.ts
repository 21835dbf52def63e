import { log } from '@/server/log'
import { runEffects } from '@/server/outbox/run-effects'
import { onOutboxWake } from '@/server/outbox/wake'

export interface Job {
  name: string
  everyMs: number
  run: () => Promise<unknown>
}

const WAKE_AFTER_MS = 40

/**
 * The one runner of clocks and effects in this process. Each job runs alone, again after its pause; a failed run is
 * logged and simply runs again: recovery is reading the state columns, never undoing.
 */
export function startJobs(jobs: Job[]): { stop: () => Promise<void> } {
  let stopping = false
  const timers = new Set<NodeJS.Timeout>()
  const running = new Set<Promise<void>>()

  const later = (ms: number, work: () => void): void => {
    const timer = setTimeout(() => {
      timers.delete(timer)
      if (!stopping) work()
    }, ms)
    timers.add(timer)
  }
  const once = (job: Job): Promise<void> => {
    const run = job
      .run()
      .then(() => undefined)
      .catch((error: unknown) => log.error({ err: error, job: job.name }, 'job failed'))
      .finally(() => running.delete(run))
    running.add(run)
    return run
  }
  const repeat = (job: Job): void => {
    void once(job).then(() => {
      if (!stopping) later(job.everyMs, () => repeat(job))
    })
  }

  let awake = false
  onOutboxWake(() => {
    if (awake || stopping) return
    awake = true
    later(WAKE_AFTER_MS, () => {
      awake = false
      void once({ name: 'effects', everyMs: 0, run: runEffects })
    })
  })
  for (const job of jobs) repeat(job)
  return {
    stop: async () => {
      stopping = true
      onOutboxWake(undefined)
      for (const timer of timers) clearTimeout(timer)
      await Promise.all(running)
    },
  }
}
