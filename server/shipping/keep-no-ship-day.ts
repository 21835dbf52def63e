import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { writeAudit } from '@/server/moderation/audit-store'
import { listNoShipDays } from '@/server/shipping/list-no-ship-days'
import { putNoShipDay } from '@/server/shipping/no-ship-days-store'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody, ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

type Asked = ParsedBody<Endpoints['keepNoShipDay']>

/** A moderator puts a day on the list or takes one off. Orders already agreed keep their day until they are dispatched. */
export async function keepNoShipDay(
  caller: Caller,
  asked: Asked,
): Promise<ReplyOf<Endpoints['keepNoShipDay']>> {
  const at = now()
  if (asked.day < at.toISOString().slice(0, 10)) {
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'That day is over. Choose one from today on.', pointer: '#/day' }],
    })
  }
  await inTransaction(async (tx) => {
    await putNoShipDay(tx, { ...asked, source: 'own', changedBy: caller.memberId, changedAt: at })
    await writeAudit(
      {
        actorId: caller.memberId,
        act: asked.isOff ? 'ship-day-opened' : 'ship-day-closed',
        subject: `ship-day:${asked.day}`,
        facts: { why: asked.why },
        at,
      },
      tx,
    )
  })
  return listNoShipDays()
}
