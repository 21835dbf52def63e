import { orderTag, orderUrl, type LetterFacts, type OrderLetter } from '@/server/orders/letters/letter-facts'
import { thingsOf } from '@/shared/domain/listings/count-words'
import { printCents } from '@/shared/units/money'

type Writer = (facts: LetterFacts) => OrderLetter[]

interface Ending {
  subject: string
  buyer: string
  seller?: string
}

/** How an order ended, to the buyer and, where there is something to know, to the seller; {things} is what was sold. */
export function ended({ subject, buyer, seller }: Ending): Writer {
  return (facts) => {
    const said = (text: string) => text.replaceAll('{things}', thingsOf(facts.terms))
    const title = { subject: said(subject), heading: said(subject) }
    return [
      {
        to: facts.buyer,
        ...title,
        blocks: [
          orderTag(facts),
          { kind: 'text', text: said(buyer) },
          { kind: 'button', label: 'See the order', url: orderUrl(facts) },
          { kind: 'text', text: `Others nearby: ${facts.origin}` },
        ],
      },
      ...(seller
        ? [
            {
              to: facts.sellerPerson,
              ...title,
              blocks: [
                orderTag(facts),
                { kind: 'text' as const, text: said(seller) },
                { kind: 'button' as const, label: 'See the order', url: orderUrl(facts) },
              ],
            },
          ]
        : []),
    ]
  }
}

const BANK = 'Your bank shows it within a few days.'
const ALL_BACK = `Every cent you paid is on its way back to your card. ${BANK}`

export const endings = {
  holdOver: ended({
    subject: 'Your hold has ended',
    buyer: 'The time to pay has passed, so the {things} are free again. Nothing was taken from your card.',
  }),
  declined: ended({
    subject: 'The seller had to decline',
    buyer: `Nothing was taken: the earmarked deposit has been let go. ${BANK}`,
  }),
  silent: ended({
    subject: 'The seller did not answer in time',
    buyer: `Nothing was taken: the earmarked deposit has been let go. ${BANK} We are sorry for the wait.`,
    seller:
      'The time to answer passed, so the request has ended and the {things} are free again. It counts in your response record.',
  }),
  sellerCancelled: ended({
    subject: 'The seller cancelled the order',
    buyer: `We are sorry. ${ALL_BACK}`,
    seller: 'You cancelled the order. The buyer has read why and gets every cent back.',
  }),
  neverScheduled: ended({
    subject: 'No day was agreed',
    buyer: `The time to agree on a day has passed. ${ALL_BACK}`,
    seller:
      'No day was agreed, so the order has ended and the buyer has everything back. The {things} are free again.',
  }),
  balanceUnpaid: ended({
    subject: 'The balance was not paid',
    buyer:
      'The balance did not come in time, so the order has ended. The deposit is kept by the terms you agreed to; nothing else is charged.',
    seller:
      'The balance did not come. The deposit is yours, less our fee on it, and the {things} are free again.',
  }),
  silentDayUnpaid: ended({
    subject: 'The balance was not paid',
    buyer: `The balance for the new day did not come, so the order has ended. You had not chosen that day: ${ALL_BACK.charAt(0).toLowerCase()}${ALL_BACK.slice(1)}`,
    seller:
      'The balance for the new day did not come. The buyer had not chosen that day and gets everything back; the animals are free again.',
  }),
  dayMissed: ended({
    subject: 'The day passed without your {things}',
    buyer: `The seller did not have them ready. ${ALL_BACK}`,
    seller:
      'The day passed and the order was not marked ready, so the buyer has everything back. It counts in your record.',
  }),
  neverSent: ended({
    subject: 'The box was never sent',
    buyer: `The ship day passed and the seller did not send the box. ${ALL_BACK}`,
    seller:
      'The ship day passed and the box was not sent, so the buyer has everything back. It counts in your record.',
  }),
  lateDecided: ended({
    subject: 'Your late box was decided',
    buyer: 'A moderator has decided; the reason and what goes where stand with the order.',
    seller: 'A moderator has decided; the reason and what goes where stand with the order.',
  }),
  buyerAbsent: ended({
    subject: 'The pickup was missed',
    buyer:
      'Nobody came and nobody objected. The deposit is kept by the terms; everything above it goes back to your card.',
    seller: 'The deposit is yours, less our fee on it. The {things} are free again.',
  }),
  sellerAbsent: ended({
    subject: 'The seller was not there',
    buyer: ALL_BACK,
    seller: 'The buyer waited and nobody objected, so they have everything back. It counts in your record.',
  }),
  holdDeclined: ended({
    subject: 'The held order has ended',
    buyer: `You did not want another day. ${ALL_BACK}`,
    seller:
      'The buyer did not want another day and gets everything back. The {things} are free again; it does not count against you.',
  }),
  holdNoConsent: ended({
    subject: 'The held order has ended',
    buyer: `You did not answer about a new day, and silence may not move it again. ${ALL_BACK}`,
    seller:
      'The buyer did not answer about a new day, so everything goes back. The {things} are free again; it does not count against you.',
  }),
  stopped: ended({
    subject: 'We stopped this order',
    buyer: `Our moderators stopped the order; the reason stands with it. ${ALL_BACK}`,
    seller: 'Our moderators stopped the order; the reason stands with it. The buyer has everything back.',
  }),
  unclear: ended({
    subject: 'We are looking at your hand-over',
    buyer:
      'The two of you do not agree on what happened, or nobody said. A moderator decides within about five days; your money stays held until then.',
    seller:
      'The two of you do not agree on what happened, or nobody said. A moderator decides within about five days; the money stays held until then.',
  }),
  decided: ended({
    subject: 'Your hand-over was decided',
    buyer: 'A moderator has decided; the reason and what goes where stand with the order.',
    seller: 'A moderator has decided; the reason and what goes where stand with the order.',
  }),
} satisfies Record<string, Writer>

/** A buyer has cancelled: what goes back and what is kept, to the cent. */
export function buyerCancelled(backCents: number): Writer {
  return (facts) => {
    const { order } = facts
    const paidCents =
      order.firstChargeCents + (order.balancePaidAt && order.payMode === 'deposit' ? order.balanceCents : 0)
    const kept = paidCents - backCents
    const back = `${printCents(backCents)} of the ${printCents(paidCents)} you paid goes back to your card. ${BANK}`
    return ended({
      subject: 'The order was cancelled',
      buyer:
        kept === 0
          ? `You cancelled the order. ${back}`
          : `You cancelled the order after its free time. ${back} ${printCents(kept)} of the deposit is kept by the terms you agreed to.`,
      seller:
        kept === 0
          ? 'The buyer cancelled in the free time and gets everything back. The {things} are free again.'
          : `The buyer cancelled late. ${printCents(kept)} of the deposit is yours, less our fee on it. The {things} are free again.`,
    })(facts)
  }
}
