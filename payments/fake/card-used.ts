import { notATestCard, testCards, type CardOutcome } from './test-cards.facts'

/** What is kept of a card: never the number. */
export interface CardUsed {
  brand: 'visa'
  last4: string
  expMonth: number
  expYear: number
  holder: string | null
  outcome: CardOutcome
  disputed: boolean
}

export interface CardEntry {
  number: string
  expMonth: number
  expYear: number
  holder: string | null
}

export function cardFromEntry(entry: CardEntry): CardUsed {
  const known = testCards.find((card) => card.number === entry.number)
  return {
    brand: 'visa',
    last4: known ? known.number.slice(-4) : '0000',
    expMonth: entry.expMonth,
    expYear: entry.expYear,
    holder: entry.holder,
    outcome: known?.outcome ?? notATestCard,
    disputed: known?.disputed ?? false,
  }
}

/** `pm_card_visa` and its kin; null for a token this practice processor does not know. */
export function cardFromToken(token: string, thisYear: number): CardUsed | null {
  const known = testCards.find((card) => card.token === token)
  if (!known) return null
  return cardFromEntry({ number: known.number, expMonth: 12, expYear: thisYear + 3, holder: null })
}
