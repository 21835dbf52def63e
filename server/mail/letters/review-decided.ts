import type { Letter, LetterBlock } from '@/server/mail/letter'
import type { reviewReasons } from '@/shared/contracts/moderation'

type Reason = (typeof reviewReasons)[number]

interface Told {
  to: { name: string; email: string }
  origin: string
  listingId: string
  title: string
  decision: 'approve' | 'ask' | 'reject'
  reason?: Reason | undefined
  note?: string | undefined
}

const reasonWords: Record<Reason, string> = {
  'species-blocked': 'We do not list this species. That is our policy for everyone.',
  'species-doubtful': 'The photo or the words leave open which species it is.',
  'photo-not-this-batch': 'A photo does not seem to show this batch.',
  'no-ruler': 'No photo shows the animals beside a ruler.',
  'papers-missing': 'A licence or health paper is missing or could not be read.',
  'contact-details': 'The words hold a way to get in touch outside this site.',
  'price-unclear': 'The price is not clear.',
  'unsafe-terms': 'A condition would not be safe for the animals or fair to buyers.',
  'wild-caught': 'Wild-caught animals are not listed here.',
  duplicate: 'The same batch is listed twice.',
  other: '',
}

const heads = {
  approve: { subject: 'is live', heading: 'Your listing is live' },
  ask: { subject: 'needs an answer from you', heading: 'A question about your listing' },
  reject: { subject: 'was not accepted', heading: 'We did not accept your listing' },
}

const next = {
  approve: 'Growers near you can find it now. Keep the count and the pickup times true.',
  ask: 'Change what is asked and submit it again. Your words are kept as you left them.',
  reject: 'If you think we are wrong, answer this mail: a person reads it.',
}

/** Tells the seller what a moderator decided, why, and what to do now. */
export function reviewMail(told: Told): Letter {
  const why = told.reason ? reasonWords[told.reason] : ''
  const rows: [string, string][] = [
    ['Listing', told.title],
    ...(why && told.decision !== 'approve' ? [['Why', why] as [string, string]] : []),
    ...(told.note ? [['Note', told.note] as [string, string]] : []),
  ]
  const blocks: LetterBlock[] = [
    { kind: 'facts', rows },
    { kind: 'text', text: next[told.decision] },
  ]
  const page = told.decision === 'approve' ? `listings/${told.listingId}` : `sell/listings/${told.listingId}`
  if (told.decision !== 'reject') {
    blocks.push({ kind: 'button', label: 'Open the listing', url: `${told.origin}/${page}` })
  }
  const { subject, heading } = heads[told.decision]
  return { to: told.to, subject: `${told.title} ${subject}`, heading, blocks }
}
