import { queueEffect } from '@/server/outbox/outbox-store'
import type { Letter } from '@/server/mail/letter'
import type { Tx } from '@/db/transaction'

/** Puts a mail into the outbox: inside the change's transaction when one is given, so neither goes without the other. */
export async function queueMail(letter: Letter, tx?: Tx): Promise<void> {
  await queueEffect({ kind: 'mail', ref: 0, body: { letter } }, tx)
}
