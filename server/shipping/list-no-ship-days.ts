import { now } from '@/server/clock'
import { noShipRowsFrom } from '@/server/shipping/no-ship-days'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

/** Days from today on, those taken off included. */
export async function listNoShipDays(): Promise<ReplyOf<Endpoints['listNoShipDays']>> {
  const rows = await noShipRowsFrom(now().toISOString().slice(0, 10))
  return {
    days: rows.map(({ day, why, source, isOff }) => ({
      day,
      why,
      source: source === 'federal' ? 'federal' : 'own',
      isOff,
    })),
  }
}
