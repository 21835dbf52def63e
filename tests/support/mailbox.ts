import type { Mail } from '@/server/mail/catcher/mail'

const EVERY_MS = 100

export interface MailWish {
  to: string
  /** Part of the subject. */
  subject?: string | RegExp
  /** Only mails that came at or after this moment. */
  since?: Date
  withinMs?: number
}

/** All caught mails to an address, newest first. */
export async function mailsTo(mailOrigin: string, to: string): Promise<Mail[]> {
  const answer = await fetch(`${mailOrigin}/api/messages?to=${encodeURIComponent(to)}`)
  if (!answer.ok) throw new Error(`the mail catcher answered ${answer.status}`)
  return (await answer.json()) as Mail[]
}

function matches(mail: Mail, { subject, since }: MailWish): boolean {
  if (since && mail.receivedAt < since.toISOString()) return false
  if (subject === undefined) return true
  return typeof subject === 'string' ? mail.subject.includes(subject) : subject.test(mail.subject)
}

/** Waits for the newest such mail; fails with the subjects that did come. */
export async function waitForMail(mailOrigin: string, wish: MailWish): Promise<Mail> {
  const until = Date.now() + (wish.withinMs ?? 15_000)
  let came: Mail[] = []
  while (Date.now() < until) {
    came = await mailsTo(mailOrigin, wish.to)
    const found = came.find((mail) => matches(mail, wish))
    if (found) return found
    await new Promise((done) => setTimeout(done, EVERY_MS))
  }
  throw new Error(`no such mail to ${wish.to}; there are: ${came.map((mail) => mail.subject).join(' | ')}`)
}

/** The first link of a mail whose address matches. */
export function linkIn(mail: Mail, pattern: RegExp): string {
  const found = mail.links.find((link) => pattern.test(link))
  if (!found)
    throw new Error(`no link like ${pattern} in "${mail.subject}"; it has: ${mail.links.join(' | ')}`)
  return found
}

export async function clearMails(mailOrigin: string): Promise<void> {
  await fetch(`${mailOrigin}/api/messages`, { method: 'DELETE' })
}

/** The bytes of an attached file; fails when the mail has none of that name. */
export async function fileIn(mailOrigin: string, mail: Mail, name: string): Promise<Uint8Array> {
  const at = mail.attachments.findIndex((file) => file.name === name)
  if (at < 0) throw new Error(`"${mail.subject}" brings ${JSON.stringify(mail.attachments)}, not ${name}`)
  const answer = await fetch(`${mailOrigin}/mails/${mail.id}/files/${at}`)
  if (!answer.ok) throw new Error(`the mail catcher answered ${answer.status}`)
  return new Uint8Array(await answer.arrayBuffer())
}
