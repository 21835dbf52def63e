import { eq, like, or } from 'drizzle-orm'

import { db } from '@/db/client'
import { user } from '@/db/schema/auth'
import { auditLog } from '@/db/schema/moderation'
import { callCount } from '@/db/schema/requests'
import { namedPeople } from '@/seed/demo/named-people.facts'
import { writeAudit } from '@/server/moderation/audit-store'

const ACT = 'demo-seeded'

/** `whole`: there to its end. `broken`: a seed was cut short; it has to begin with an empty database. */
export async function findDemo(): Promise<'none' | 'broken' | 'whole'> {
  if ((await db().$count(auditLog, eq(auditLog.act, ACT))) > 0) return 'whole'
  const begun = await db().$count(user, eq(user.email, namedPeople[0]?.email ?? ''))
  return begun > 0 ? 'broken' : 'none'
}

/** The last row of the demo: what came before is all there. */
export async function markDemo(actorId: string, facts: Record<string, number>, at: Date): Promise<void> {
  await writeAudit({ actorId, act: ACT, subject: 'demo', facts, at })
}

/** The demo's people have used up none of their own limits: those count real hours. */
export async function forgetDemoCalls(): Promise<void> {
  const names = ['upload', 'begin-listing', 'submit-listing']
  await db()
    .delete(callCount)
    .where(or(...names.map((name) => like(callCount.bucket, `${name}:%`))))
}
