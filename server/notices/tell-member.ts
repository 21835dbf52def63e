import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Letter } from '@/server/mail/letter'
import { queueMail } from '@/server/mail/queue-mail'
import { newPublicId } from '@/server/new-public-id'
import { insertNotice } from '@/server/notices/notice-store'
import type { NoticeKind } from '@/shared/contracts/notices'

export interface Telling {
  memberId: string
  kind: NoticeKind
  /** The happening: a member is told of each once. */
  cause: string
  about: { orderId: number } | { listingId: number }
  /** The name of the batch. */
  title: string
  letter: Letter
}

/**
 * Tells a member inside the product and by mail, in the transaction of what happened. False, and nothing is written,
 * when they were told of this very cause before.
 */
export async function tellMember(tx: Tx, telling: Telling): Promise<boolean> {
  const { memberId, kind, cause, about, title, letter } = telling
  const isNew = await insertNotice(tx, {
    publicId: newPublicId(),
    memberId,
    kind,
    cause,
    ...about,
    facts: { subject: letter.subject, title },
    createdAt: now(),
  })
  if (isNew) await queueMail(letter, tx)
  return isNew
}
