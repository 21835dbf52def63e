import type { Letter } from '@/server/mail/letter'

export function resetPasswordMail(told: { to: { name: string; email: string }; url: string }): Letter {
  return {
    to: told.to,
    subject: 'Choose a new Tankward password',
    heading: 'A new password',
    blocks: [
      { kind: 'text', text: 'Somebody, we hope you, asked to choose a new password for this address.' },
      { kind: 'button', label: 'Choose a new password', url: told.url },
      {
        kind: 'text',
        text: 'The link works once, for ten minutes, and signs you out everywhere else. If it was not you, ignore it.',
      },
    ],
  }
}
