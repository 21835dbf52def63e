import type { Decision } from '@/hooks/use-moderation'

import type { Choice } from '@/components/ui/choice'

export type DecisionKind = Decision['decision']
export type ReviewReason = NonNullable<Decision['reason']>

export const decisionWords: Record<
  DecisionKind,
  { title: string; act: string; busy: string; effect: string; done: string }
> = {
  approve: {
    title: 'Approve',
    act: 'Approve it',
    busy: 'Approving',
    effect: 'It goes live at once, and the seller gets a mail.',
    done: 'Approved',
  },
  ask: {
    title: 'Ask the seller',
    act: 'Send the question',
    busy: 'Sending',
    effect: 'It stays off sale. The seller gets your words and a way to the field.',
    done: 'Asked',
  },
  reject: {
    title: 'Reject',
    act: 'Reject it',
    busy: 'Rejecting',
    effect: 'The seller gets the reason. It is written down for good.',
    done: 'Rejected',
  },
}

const reasonLabels: Record<ReviewReason, string> = {
  'species-blocked': 'We do not list this species',
  'species-doubtful': 'Species in doubt',
  'photo-not-this-batch': 'Photo is not of this batch',
  'no-ruler': 'No ruler to be seen',
  'papers-missing': 'Papers missing',
  'contact-details': 'Contact details in the text',
  'price-unclear': 'Price unclear',
  'unsafe-terms': 'Terms that harm buyers or fish',
  'wild-caught': 'Wild-caught',
  duplicate: 'The same batch twice',
  other: 'Something else',
}
const reasons = Object.keys(reasonLabels) as ReviewReason[]
const keys = ['1', '2', '3', '4', '5', '6', '7', '8', '9', '0', 'o']

/** Each reason with the key that chooses it in front. */
export const reasonChoices: readonly Choice<ReviewReason>[] = reasons.map((reason, at) => ({
  value: reason,
  label: `${keys[at] ?? ''}  ${reasonLabels[reason]}`,
}))

/** The reason a key chooses. undefined: none. */
export function reasonOfKey(key: string): ReviewReason | undefined {
  const at = keys.indexOf(key)
  return at === -1 ? undefined : reasons[at]
}
