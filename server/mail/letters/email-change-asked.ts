import type { Letter } from '@/server/mail/letter'

interface Told {
  to: { name: string; email: string }
  newEmail: string
  origin: string
}

/** To the address in use, whatever becomes of the change: a thief cannot move an account in silence. */
export function emailChangeAskedMail({ to, newEmail, origin }: Told): Letter {
  return {
    to,
    subject: 'Your Tankward account is to get another e-mail address',
    heading: 'Another e-mail address was asked for',
    blocks: [
      { kind: 'facts', rows: [['New address', newEmail]] },
      {
        kind: 'text',
        text: 'It changes when the link in the mail to the new address is opened. The password was given for it.',
      },
      {
        kind: 'text',
        text: 'If it was not you, change your password now: that signs out everybody else.',
      },
      { kind: 'button', label: 'Open your account', url: `${origin}/account` },
    ],
  }
}
