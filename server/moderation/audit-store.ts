import { db, type Tx } from '@/db/client'
import { auditLog } from '@/db/schema/moderation'

export interface AuditEntry {
  actorId: string
  act: string
  /** What was acted on: `listing:12`, `member:…`. */
  subject: string
  facts: Record<string, unknown>
  at: Date
}

/** Append-only: nothing changes or deletes a row of it. */
export async function writeAudit(entry: AuditEntry, tx: Tx = db()): Promise<void> {
  await tx.insert(auditLog).values(entry)
}
