import type { HoldRow } from '@/server/orders/hold-store'
import {
  orderTag,
  orderUrl,
  slotText,
  type LetterFacts,
  type OrderLetter,
} from '@/server/orders/letters/letter-facts'
import { countWords } from '@/shared/domain/listings/count-words'
import { printDay, printMoment, printSlot } from '@/shared/times/print-time'

type Writer = (facts: LetterFacts) => OrderLetter[]

const say = (text: string) => ({ kind: 'text' as const, text })

/** The proposed day (a box) or window (a pickup), in the seller's zone. */
function proposalText({ order }: LetterFacts, hold: HoldRow): string {
  const { proposedStartsAt: from, proposedEndsAt: until } = hold
  if (!from || !until) return 'No day can be named yet'
  if (order.handOver === 'ship') return printDay(from.toISOString(), order.zone)
  return printSlot({ startsAt: from.toISOString(), endsAt: until.toISOString(), zone: order.zone })
}

function silenceText({ order }: LetterFacts, { silenceMoves }: HoldRow): string {
  const until = order.clockAt ? printMoment(order.clockAt.toISOString(), order.zone) : 'the clock ends'
  return silenceMoves
    ? `If you say nothing until ${until}, the new day counts; you can still cancel free of cost until it begins.`
    : `If you say nothing until ${until}, the order ends and every cent goes back to your card.`
}

/** E18, E27: what the weather does, the day proposed, what silence means, and the way out. */
export const held =
  (hold: HoldRow): Writer =>
  (facts) => [
    {
      to: facts.buyer,
      subject: 'Held for weather: please answer about a new day',
      heading: 'The weather is against it',
      blocks: [
        orderTag(facts),
        say(hold.why),
        { kind: 'facts', rows: [['Proposed instead', proposalText(facts, hold)]] },
        say(silenceText(facts, hold)),
        { kind: 'button', label: 'Answer', url: orderUrl(facts) },
      ],
    },
    {
      to: facts.sellerPerson,
      subject: 'Held for weather: do not pack this order',
      heading: `${facts.buyer.name} is asked about a new day`,
      blocks: [
        orderTag(facts),
        say(hold.why),
        { kind: 'facts', rows: [['Proposed instead', proposalText(facts, hold)]] },
        { kind: 'button', label: 'See the order', url: orderUrl(facts) },
      ],
    },
  ]

/** E19: the day that counts from now on. */
export const rescheduled: Writer = (facts) => {
  const when =
    facts.order.handOver === 'ship' && facts.order.slotStartsAt
      ? `leaves ${printDay(facts.order.slotStartsAt.toISOString(), facts.order.zone)}`
      : slotText(facts)
  const blocks = [
    orderTag(facts),
    { kind: 'facts' as const, rows: [['New day', when]] satisfies [string, string][] },
  ]
  const button = { kind: 'button' as const, label: 'See the order', url: orderUrl(facts) }
  return [
    {
      to: facts.buyer,
      subject: `New day: ${when}`,
      heading: facts.order.isDayBySilence ? 'The new day counts now' : 'Thank you: the new day counts',
      blocks: [
        ...blocks,
        ...(facts.order.isDayBySilence
          ? [
              say(
                'You did not answer, so the proposed day was taken. Until it begins you may cancel free of cost.',
              ),
            ]
          : []),
        button,
      ],
    },
    {
      to: facts.sellerPerson,
      subject: `New day: ${when}`,
      heading: `${countWords(facts.terms, facts.order.quantity)} have a new day`,
      blocks: [...blocks, button],
    },
  ]
}
