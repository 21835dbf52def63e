import { log } from '@/server/log'
import { countOverview, type Overview } from '@/server/search/overview-store'

const FRESH_MS = 60_000

/** Holds the overview and counts anew once a minute, when somebody searches; nobody waits but the very first. */
export class OverviewKeeper {
  private overview: Overview | null = null
  private counting: Promise<Overview> | null = null
  private countedAtMs = -Infinity

  async current(): Promise<Overview> {
    if (this.overview && performance.now() - this.countedAtMs < FRESH_MS) return this.overview
    const counting = this.count()
    if (!this.overview) return counting
    counting.catch((error: unknown) => log.warn({ err: error }, 'listings could not be counted for search'))
    return this.overview
  }

  /** Counts now; several callers share one count. */
  count(): Promise<Overview> {
    this.counting ??= countOverview()
      .then((overview) => (this.overview = overview))
      .finally(() => {
        // Also after a failure: the old figures serve, and the next try waits its minute.
        this.countedAtMs = performance.now()
        this.counting = null
      })
    return this.counting
  }
}
