import type { Letter } from '@/server/mail/letter'

export function signUpAgainMail(told: { to: { name: string; email: string }; origin: string }): Letter {
  return {
    to: told.to,
    subject: 'You already have a Tankward account',
    heading: 'You are already with us',
    blocks: [
      { kind: 'text', text: 'Somebody tried to sign up with this address. It has an account already.' },
      { kind: 'button', label: 'Sign in', url: `${told.origin}/sign-in` },
      {
        kind: 'text',
        text: 'Forgot the password? Choose "New password" there. If it was not you, ignore this mail.',
      },
    ],
  }
}
