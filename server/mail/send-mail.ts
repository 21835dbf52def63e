import nodemailer, { type Transporter } from 'nodemailer'

import type { Letter } from '@/server/mail/letter'
import { renderLetter } from '@/server/mail/render-letter'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { GiveUp } from '@/server/outbox/run-effects'

// One addr-spec and nothing else: a comma, a line break or a group would let a recipient string name somebody else.
const ONE_ADDRESS = /^[^\s@,;:<>()[\]"\\\u0000-\u001f]{1,64}@[A-Za-z0-9](?:[A-Za-z0-9.-]{0,250}[A-Za-z0-9])?$/

let transport: Transporter | undefined
let from = { name: 'Tankward', address: 'hello@tankward.example' }
let host = 'tankward.example'

export function configureMail(settings: { smtpUrl: string; from: string }): void {
  transport = nodemailer.createTransport(settings.smtpUrl, { from: settings.from })
  from = { name: 'Tankward', address: settings.from }
  host = settings.from.split('@')[1] ?? host
}

/** Sends one queued letter. The message id comes from the outbox row, so a repeat is recognised as the same mail. */
export async function sendMail(effect: Effect): Promise<void> {
  const letter = effect.body.letter as Letter
  if (!ONE_ADDRESS.test(letter.to.email)) throw new GiveUp('the address is not one plain address')
  if (!transport) throw new Error('mail is not configured')
  const { html, text } = renderLetter(letter)
  await transport.sendMail({
    from,
    to: { name: letter.to.name.replace(/[\r\n"<>]/g, ' '), address: letter.to.email },
    subject: letter.subject.replace(/[\r\n]/g, ' '),
    text,
    html,
    messageId: `<effect-${effect.seq}@${host}>`,
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
  await finishEffect(effect.seq)
}
