import type { Letter } from '@/server/mail/letter'

export function verifyEmailMail(told: { to: { name: string; email: string }; url: string }): Letter {
  return {
    to: told.to,
    subject: 'Confirm your e-mail address for Tankward',
    heading: `Welcome, ${told.to.name}`,
    blocks: [
      {
        kind: 'text',
        text: 'Confirm this address and you can hold animals, pay deposits and sell what you raise.',
      },
      { kind: 'button', label: 'Confirm my address', url: told.url },
      {
        kind: 'text',
        text: 'The link works for one hour. If you did not sign up, ignore this mail: nothing happens.',
      },
    ],
  }
}
