import { inTransaction } from '@/db/transaction'
import { isMember, saveProfile } from '@/server/members/member-store'

/** An account that is gone needs no more reminders either: nothing to do. */
export async function stopReminders(memberId: string, at: Date): Promise<void> {
  await inTransaction(async (tx) => {
    if (await isMember(memberId, tx)) await saveProfile(memberId, { reminderMail: false, updatedAt: at }, tx)
  })
}
