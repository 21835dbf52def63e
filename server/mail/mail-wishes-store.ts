import { inArray } from 'drizzle-orm'

import { db } from '@/db/client'
import { memberProfile } from '@/db/schema/members'

export interface MailWishes {
  reminders: boolean
  quiet: { from: string; until: string; zone: string } | null
}

/** Whoever never said anything has no row here: reminders come, no hour is quiet. */
export async function readMailWishes(memberIds: string[]): Promise<Map<string, MailWishes>> {
  if (memberIds.length === 0) return new Map()
  const rows = await db()
    .select({
      memberId: memberProfile.memberId,
      reminders: memberProfile.reminderMail,
      from: memberProfile.quietFrom,
      until: memberProfile.quietUntil,
      zone: memberProfile.quietZone,
    })
    .from(memberProfile)
    .where(inArray(memberProfile.memberId, memberIds))
  return new Map(
    rows.map(({ memberId, reminders, from, until, zone }) => [
      memberId,
      { reminders, quiet: from && until && zone ? { from, until, zone } : null },
    ]),
  )
}
