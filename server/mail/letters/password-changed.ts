import type { Letter } from '@/server/mail/letter'

export function passwordChangedMail(told: { to: { name: string; email: string }; origin: string }): Letter {
  return {
    to: told.to,
    subject: 'Your Tankward password was changed',
    heading: 'Your password was changed',
    blocks: [
      { kind: 'text', text: 'Every other device was signed out. If it was you, there is nothing to do.' },
      { kind: 'text', text: 'If it was not you, choose a new password by mail at once.' },
      { kind: 'button', label: 'Choose a new password', url: `${told.origin}/forgot-password` },
    ],
  }
}
