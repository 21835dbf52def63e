import type { Caller } from '@/server/http/caller'
import { deleteSession } from '@/server/sessions/session-store'
import { Problem } from '@/shared/api/problem'

/** Another member's sign-in answers like one that never was. */
export async function endSession(caller: Caller, sessionId: string): Promise<undefined> {
  if (!(await deleteSession(caller.memberId, sessionId)))
    throw new Problem('not-found', 'That device is signed out already.')
}
