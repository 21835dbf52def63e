import { log } from '@/server/log'
import { DensityHistogram } from '@/server/search/density-histogram'
import { countDensity } from '@/server/search/density-store'

const FRESH_MS = 60_000

/** Holds the histogram and counts anew once a minute, when somebody searches; nobody waits but the very first. */
export class DensityKeeper {
  private histogram: DensityHistogram | null = null
  private counting: Promise<DensityHistogram> | null = null
  private countedAtMs = -Infinity

  async current(): Promise<DensityHistogram> {
    if (this.histogram && performance.now() - this.countedAtMs < FRESH_MS) return this.histogram
    const counting = this.count()
    if (!this.histogram) return counting
    counting.catch((error: unknown) => log.warn({ err: error }, 'density of listings could not be counted'))
    return this.histogram
  }

  /** Counts now; several callers share one count. */
  count(): Promise<DensityHistogram> {
    this.counting ??= countDensity()
      .then((cells) => (this.histogram = new DensityHistogram(cells)))
      .finally(() => {
        // Also after a failure: the old figures serve, and the next try waits its minute.
        this.countedAtMs = performance.now()
        this.counting = null
      })
    return this.counting
  }
}
