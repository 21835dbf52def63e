import { and, desc, eq, gt, ne } from 'drizzle-orm'

import { db } from '@/db/client'
import { session } from '@/db/schema/auth'

export type SessionRow = Pick<typeof session.$inferSelect, 'id' | 'userAgent' | 'createdAt' | 'updatedAt'>

const MOST = 100

/** Sign-ins that still hold, the latest used first. The token never leaves the table. */
export async function listOpenSessions(memberId: string, at: Date): Promise<SessionRow[]> {
  return db()
    .select({
      id: session.id,
      userAgent: session.userAgent,
      createdAt: session.createdAt,
      updatedAt: session.updatedAt,
    })
    .from(session)
    .where(and(eq(session.userId, memberId), gt(session.expiresAt, at)))
    .orderBy(desc(session.updatedAt))
    .limit(MOST)
}

/** True when the member had such a sign-in: nobody ends another's. */
export async function deleteSession(memberId: string, sessionId: string): Promise<boolean> {
  const [done] = await db()
    .delete(session)
    .where(and(eq(session.id, sessionId), eq(session.userId, memberId)))
  return done.affectedRows === 1
}

export async function deleteOtherSessions(memberId: string, keptId: string): Promise<void> {
  await db()
    .delete(session)
    .where(and(eq(session.userId, memberId), ne(session.id, keptId)))
}
