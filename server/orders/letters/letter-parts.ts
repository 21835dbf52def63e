import type { Letter } from '@/server/mail/letter'
import { orderUrl, type LetterFacts, type OrderLetter } from '@/server/orders/letters/letter-facts'
import { printMoment } from '@/shared/times/print-time'

export type Writer = (facts: LetterFacts) => OrderLetter[]

export const see = (facts: LetterFacts, label: string) => ({
  kind: 'button' as const,
  label,
  url: orderUrl(facts),
})

export const say = (text: string) => ({ kind: 'text' as const, text })

export const untilClock = ({ order }: LetterFacts) =>
  order.clockAt ? printMoment(order.clockAt.toISOString(), order.zone) : 'the clock ends'

export const toBuyer = (facts: LetterFacts, letter: Omit<Letter, 'to'>): OrderLetter => ({
  to: facts.buyer,
  ...letter,
})

export const toSeller = (facts: LetterFacts, letter: Omit<Letter, 'to'>): OrderLetter => ({
  to: facts.sellerPerson,
  ...letter,
})
