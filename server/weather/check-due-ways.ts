import { now } from '@/server/clock'
import { fewAtATime } from '@/server/jobs/few-at-a-time'
import { log } from '@/server/log'
import { checkWay } from '@/server/weather/check-way'
import { listDueChecks, type DueCheck } from '@/server/weather/weather-store'
import { Problem } from '@/shared/api/problem'

const MOST_AT_A_TIME = 200
/** A forecast that hangs is waited for some 3.4 s a box: in lanes, 200 boxes take a minute and a half at worst. */
export const LANES = 8

async function check({ order, kind }: DueCheck): Promise<void> {
  try {
    await checkWay(order, { kind, holds: true, isFresh: true })
  } catch (error) {
    if (error instanceof Problem && error.slug === 'order-moved') return
    log.error({ err: error, orderId: order.id, kind }, 'a way could not be looked at')
  }
}

/**
 * 16:00 of the day before and 06:00 of the day, at the seller's place: boxes whose way has turned unsafe are held. A late
 * start makes up for the morning alone.
 */
export async function checkDueWays(): Promise<void> {
  await fewAtATime(await listDueChecks(now(), MOST_AT_A_TIME), LANES, check)
}
