import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { renameMember, saveProfile } from '@/server/members/member-store'
import { readMe } from '@/server/members/read-me'
import { requirePlace } from '@/server/places/find-place'
import type { Me } from '@/shared/contracts/members'

export interface MeChange {
  name?: string | undefined
  place?: string | undefined
  placeLabel?: string | undefined
  units?: Me['units'] | undefined
  theme?: Me['theme'] | undefined
  reminders?: boolean | undefined
  quiet?: Me['mail']['quiet'] | null
}

const quietColumns = (quiet: NonNullable<MeChange['quiet']> | null) => ({
  quietFrom: quiet?.from ?? null,
  quietUntil: quiet?.until ?? null,
  quietZone: quiet?.zone ?? null,
})

export async function changeMe(caller: Caller, change: MeChange): Promise<Me> {
  const place = change.place === undefined ? undefined : await requirePlace(change.place, '#/place')
  await inTransaction(async (tx) => {
    if (change.name !== undefined) await renameMember(caller.memberId, change.name, tx)
    await saveProfile(
      caller.memberId,
      {
        ...(place
          ? { placeCell: place.cellId, placeState: place.state, placeLabel: change.placeLabel || place.label }
          : {}),
        ...(change.units ? { units: change.units } : {}),
        ...(change.theme ? { theme: change.theme } : {}),
        ...(change.reminders === undefined ? {} : { reminderMail: change.reminders }),
        ...(change.quiet === undefined ? {} : quietColumns(change.quiet)),
        updatedAt: now(),
      },
      tx,
    )
  })
  return readMe(caller)
}
