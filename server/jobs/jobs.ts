import { dropOldKeys } from '@/server/http/idempotency-store'
import { dropOldCounts } from '@/server/http/call-limit-store'
import type { Job } from '@/server/jobs/job-runner'
import { ringClocks } from '@/server/jobs/ring-clocks'
import { expireListings } from '@/server/listings/expire-listings'
import { refreshQuietPayments } from '@/server/money/refresh-payment'
import { remindBoxes } from '@/server/notices/remind-boxes'
import { remindPickups } from '@/server/notices/remind-pickups'
import { askSurvival } from '@/server/ratings/ask-survival'
import { runEffects } from '@/server/outbox/run-effects'
import { refreshSiteMean } from '@/server/search/refresh-site-mean'
import { checkDueWays } from '@/server/weather/check-due-ways'
import { keepFederalDays } from '@/server/shipping/no-ship-days'

const SECOND = 1000
const HOUR = 3600 * SECOND
const DAY = 24 * HOUR

/** Everything that happens by itself in this process. */
export function jobsOf(): Job[] {
  return [
    { name: 'effects', everyMs: 2 * SECOND, run: runEffects },
    { name: 'clocks', everyMs: 2 * SECOND, run: ringClocks },
    { name: 'reminders', everyMs: 20 * SECOND, run: remindPickups },
    { name: 'ways', everyMs: 30 * SECOND, run: checkDueWays },
    { name: 'box-reminders', everyMs: 20 * SECOND, run: remindBoxes },
    { name: 'expired-listings', everyMs: 5 * 60 * SECOND, run: expireListings },
    { name: 'survival-questions', everyMs: 60 * SECOND, run: askSurvival },
    { name: 'site-mean', everyMs: HOUR, run: refreshSiteMean },
    { name: 'federal-days', everyMs: DAY, run: keepFederalDays },
    { name: 'quiet-payments', everyMs: 10 * SECOND, run: refreshQuietPayments },
    {
      name: 'forget',
      everyMs: HOUR,
      run: async () => {
        await dropOldKeys(new Date(Date.now() - DAY))
        await dropOldCounts(Math.floor((Date.now() - DAY) / SECOND))
      },
    },
  ]
}
