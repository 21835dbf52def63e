import type { Letter } from '@/server/mail/letter'

/** To the new address: nothing changes before its link is opened. */
export function confirmNewEmailMail(told: { to: { name: string; email: string }; url: string }): Letter {
  return {
    to: told.to,
    subject: 'Confirm your new e-mail address for Tankward',
    heading: 'Is this your new address?',
    blocks: [
      {
        kind: 'text',
        text: 'Somebody who is signed in to a Tankward account wants to use this address for it from now on.',
      },
      { kind: 'button', label: 'Use this address', url: told.url },
      {
        kind: 'text',
        text: 'The link works for one hour. If it was not you, ignore this mail: nothing changes.',
      },
    ],
  }
}
