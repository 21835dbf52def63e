export interface Decline {
  code: string
  declineCode?: string
  /** What the buyer reads. Lost and stolen read like any other decline: the processor's guidance on decline codes. */
  message: string
  /** Refused before it reached the bank: no charge is written. */
  atTheCounter?: boolean
}

export type CardOutcome =
  { kind: 'approve' } | { kind: 'decline'; decline: Decline } | { kind: 'challenge'; after: CardOutcome }

export interface TestCard {
  number: string
  means: string
  outcome: CardOutcome
  /** Payment-method token of the API that stands for this card. */
  token?: string
  disputed?: boolean
}

const PLAIN = 'Your card was declined.'

export const approve: CardOutcome = { kind: 'approve' }

function decline(code: string, message: string, more: Partial<Decline> = {}): CardOutcome {
  return { kind: 'decline', decline: { code, message, ...more } }
}

const genericDecline = decline('card_declined', PLAIN, { declineCode: 'generic_decline' })

// Source: docs.stripe.com/testing and /declines/codes (read in part); the two rows of kind `challenge` are from memory.
export const testCards: readonly TestCard[] = [
  { number: '4242424242424242', means: 'goes through', outcome: approve, token: 'pm_card_visa' },
  {
    number: '4000000000000002',
    means: 'declined, no reason given',
    outcome: genericDecline,
    token: 'pm_card_chargeDeclined',
  },
  {
    number: '4000000000009995',
    means: 'declined: too little money on the account',
    outcome: decline('card_declined', 'Your card has insufficient funds.', {
      declineCode: 'insufficient_funds',
    }),
    token: 'pm_card_chargeDeclinedInsufficientFunds',
  },
  {
    number: '4000000000009987',
    means: 'reported lost, reads as a plain decline',
    outcome: decline('card_declined', PLAIN, { declineCode: 'lost_card' }),
  },
  {
    number: '4000000000009979',
    means: 'reported stolen, reads as a plain decline',
    outcome: decline('card_declined', PLAIN, { declineCode: 'stolen_card' }),
  },
  {
    number: '4000000000000069',
    means: 'expired card',
    outcome: decline('expired_card', 'Your card has expired.'),
  },
  {
    number: '4000000000000127',
    means: 'wrong security code',
    outcome: decline('incorrect_cvc', "Your card's security code is incorrect."),
  },
  {
    number: '4000000000000119',
    means: 'error while processing',
    outcome: decline(
      'processing_error',
      'The card could not be processed just now. Try again in a little while.',
    ),
  },
  {
    number: '4242424242424241',
    means: 'number with a slip in it',
    outcome: decline('incorrect_number', 'Your card number is incorrect.', { atTheCounter: true }),
  },
  {
    number: '4000002760003184',
    means: 'asks for approval by the bank (3-D Secure)',
    outcome: { kind: 'challenge', after: approve },
    token: 'pm_card_authenticationRequired',
  },
  {
    number: '4000008400001629',
    means: 'asks for approval, then declines',
    outcome: { kind: 'challenge', after: genericDecline },
  },
  {
    number: '4000000000000259',
    means: 'goes through, the holder disputes it at once',
    outcome: approve,
    disputed: true,
  },
]

/** A number that is no test card: the processor refuses live cards in test mode. */
export const notATestCard = decline(
  'card_declined',
  'Only the practice cards listed below work on this page.',
  {
    declineCode: 'test_mode_live_card',
    atTheCounter: true,
  },
)
