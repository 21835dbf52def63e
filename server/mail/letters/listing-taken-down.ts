import type { Letter, LetterBlock } from '@/server/mail/letter'
import type { TakeDownReason } from '@/shared/domain/listings/take-down-reasons'
import { takeDownWords } from '@/shared/domain/listings/take-down-words'

interface Told {
  to: { name: string; email: string }
  origin: string
  title: string
  reason: TakeDownReason
  note?: string | undefined
  openOrders: number
}

function ordersWords(openOrders: number): string {
  if (openOrders === 0) return 'No order is open from it.'
  return openOrders === 1
    ? 'One order is open from it. It stands as agreed: nothing of it was changed.'
    : `${openOrders} orders are open from it. They stand as agreed: nothing of them was changed.`
}

/** Tells the seller that a moderator took a listing off sale, why, and what becomes of its orders. */
export function takenDownMail(told: Told): Letter {
  const why = takeDownWords[told.reason]
  const rows: [string, string][] = [
    ['Listing', told.title],
    ...(why ? [['Why', why] as [string, string]] : []),
    ...(told.note ? [['Note', told.note] as [string, string]] : []),
    ['Orders', ordersWords(told.openOrders)],
  ]
  const orders: LetterBlock[] =
    told.openOrders > 0 ? [{ kind: 'button', label: 'Open my orders', url: `${told.origin}/orders` }] : []
  return {
    to: told.to,
    subject: `${told.title} was taken off sale`,
    heading: 'We took your listing off sale',
    blocks: [
      { kind: 'facts', rows },
      {
        kind: 'text',
        text: 'It cannot be found or held any more. If you think we are wrong, answer this mail: a person reads it.',
      },
      ...orders,
    ],
  }
}
