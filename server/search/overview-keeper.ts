import { log } from '@/server/log'
import { countOverview, type Overview } from '@/server/search/overview-store'

const FRESH_MS = 60_000
/** Counting may take a fiftieth of the time, however many listings there are. */
const REST = 50

/** Holds the overview and counts anew when it is a minute old and somebody searches; nobody waits but the first. */
export class OverviewKeeper {
  private overview: Overview | null = null
  private counting: Promise<Overview> | null = null
  private freshUntilMs = -Infinity

  async current(): Promise<Overview> {
    if (this.overview && performance.now() < this.freshUntilMs) return this.overview
    const counting = this.count()
    if (!this.overview) return counting
    counting.catch((error: unknown) => log.warn({ err: error }, 'listings could not be counted for search'))
    return this.overview
  }

  /** Counts now; several callers share one count. */
  count(): Promise<Overview> {
    const beganMs = performance.now()
    this.counting ??= countOverview()
      .then((overview) => (this.overview = overview))
      .finally(() => {
        // Also after a failure: the old figures serve, and the next try waits its minute.
        const tookMs = performance.now() - beganMs
        this.freshUntilMs = performance.now() + Math.max(FRESH_MS, tookMs * REST)
        this.counting = null
      })
    return this.counting
  }
}
