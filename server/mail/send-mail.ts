import nodemailer, { type Transporter } from 'nodemailer'

import type { Letter } from '@/server/mail/letter'
import { mailSender, setMailSender } from '@/server/mail/mail-sender'
import { readMailWishes } from '@/server/mail/mail-wishes-store'
import { renderLetter } from '@/server/mail/render-letter'
import { unsubscribeUrl } from '@/server/mail/unsubscribe-token'
import { failPoint } from '@/server/outbox/fail-point'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { GiveUp } from '@/server/outbox/run-effects'

// One addr-spec and nothing else: a comma, a line break or a group would let a recipient string name somebody else.
const ONE_ADDRESS = /^[^\s@,;:<>()[\]"\\\u0000-\u001f]{1,64}@[A-Za-z0-9](?:[A-Za-z0-9.-]{0,250}[A-Za-z0-9])?$/

let transport: Transporter | undefined

export function configureMail(settings: { smtpUrl: string; from: string }): void {
  transport = nodemailer.createTransport(settings.smtpUrl, { from: settings.from })
  setMailSender(settings.from)
}

/** A member who has just switched it off gets not even the mail that was waiting already. */
async function isStillWanted({ optional }: Letter): Promise<boolean> {
  if (!optional) return true
  const wishes = (await readMailWishes([optional.memberId])).get(optional.memberId)
  return wishes?.[optional.list] ?? true
}

/** RFC 8058: both headers together tell a mail program that one POST is enough. */
const leaveHeaders = (url: string) => ({
  'List-Unsubscribe': `<${url}>`,
  'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
})

/** Sends one queued letter. The message id comes from the outbox row, so a repeat is recognised as the same mail. */
export async function sendMail(effect: Effect): Promise<void> {
  const letter = effect.body.letter as Letter
  if (!ONE_ADDRESS.test(letter.to.email)) throw new GiveUp('the address is not one plain address')
  if (!transport) throw new Error('mail is not configured')
  if (!(await isStillWanted(letter))) return finishEffect(effect.seq)
  const leaveUrl = letter.optional && unsubscribeUrl(letter.optional)
  const from = mailSender()
  const { html, text } = renderLetter(letter, leaveUrl)
  await transport.sendMail({
    from,
    to: { name: letter.to.name.replace(/[\r\n"<>]/g, ' '), address: letter.to.email },
    subject: letter.subject.replace(/[\r\n]/g, ' '),
    text,
    html,
    messageId: `<effect-${effect.seq}@${from.address.split('@')[1]}>`,
    ...(leaveUrl ? { headers: leaveHeaders(leaveUrl) } : {}),
    ...(letter.calendar
      ? {
          icalEvent: {
            method: letter.calendar.method,
            filename: letter.calendar.fileName,
            content: letter.calendar.text,
          },
        }
      : {}),
  })
  failPoint('mail:called')
  await finishEffect(effect.seq)
}
