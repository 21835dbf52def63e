import type { Letter } from '@/server/mail/letter'
import { orderTag, orderUrl, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { shortName } from '@/server/ratings/short-name'

/** To the seller, without the words: a mail is no place for what a moderator may have to hide. */
export function ratedLetter(facts: LetterFacts) {
  return {
    to: facts.sellerPerson,
    subject: `${shortName(facts.buyer.name)} rated an order`,
    heading: 'A buyer has rated you',
    blocks: [
      orderTag(facts),
      { kind: 'text', text: 'Everybody can read it on your page. You may reply once, in public.' },
      { kind: 'button', label: 'Read it and reply', url: orderUrl(facts) },
    ],
  } satisfies Letter
}

/** To the buyer, once. */
export function repliedLetter(facts: LetterFacts) {
  return {
    to: facts.buyer,
    subject: `${facts.seller.farmName} replied to your rating`,
    heading: 'A reply to your rating',
    blocks: [
      orderTag(facts),
      { kind: 'text', text: 'The reply stands under your rating on the seller’s page.' },
      { kind: 'button', label: 'Read the reply', url: orderUrl(facts) },
    ],
  } satisfies Letter
}
