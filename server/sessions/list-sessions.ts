import type { Caller } from '@/server/http/caller'
import { deviceWords } from '@/server/sessions/device-words'
import { listOpenSessions } from '@/server/sessions/session-store'
import type { ShownSession } from '@/shared/contracts/sessions'

export async function listSessions(caller: Caller): Promise<{ items: ShownSession[] }> {
  const rows = await listOpenSessions(caller.memberId, new Date())
  const items = rows.map((row) => ({
    sessionId: row.id,
    device: deviceWords(row.userAgent),
    startedAt: row.createdAt.toISOString(),
    lastUsedAt: row.updatedAt.toISOString(),
    isThis: row.id === caller.sessionId,
  }))
  return { items: items.sort((a, b) => Number(b.isThis) - Number(a.isThis)) }
}
