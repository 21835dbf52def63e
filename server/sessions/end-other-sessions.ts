import type { Caller } from '@/server/http/caller'
import { deleteOtherSessions } from '@/server/sessions/session-store'

export async function endOtherSessions(caller: Caller): Promise<undefined> {
  await deleteOtherSessions(caller.memberId, caller.sessionId)
}
