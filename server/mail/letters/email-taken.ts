import type { Letter } from '@/server/mail/letter'

/** To the owner of an address that somebody else named as their new one. */
export function emailTakenMail(told: { to: { name: string; email: string } }): Letter {
  return {
    to: told.to,
    subject: 'Your e-mail address was named for another Tankward account',
    heading: 'Your account is unchanged',
    blocks: [
      {
        kind: 'text',
        text: 'Another member named this address as their new one. It belongs to your account, so nothing changed.',
      },
      {
        kind: 'text',
        text: 'If it was you with a second account, keep using the first, or ignore this mail.',
      },
    ],
  }
}
