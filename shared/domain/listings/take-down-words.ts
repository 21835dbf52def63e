/** Why a moderator takes a listing off sale; `other` needs words of its own. */
export const takeDownReasons = [
  'species-blocked',
  'not-as-told',
  'bad-state',
  'unlawful',
  'contact-details',
  'wild-caught',
  'other',
] as const
export type TakeDownReason = (typeof takeDownReasons)[number]

/** As the seller is told, by mail and on the desk. '' where the moderator's own words say it. */
export const takeDownWords: Readonly<Record<TakeDownReason, string>> = {
  'species-blocked': 'We do not list this species. That is our policy for everyone.',
  'not-as-told': 'What is offered is not what the listing says.',
  'bad-state': 'The animals seem to be in a bad state.',
  unlawful: 'The offer is not lawful, or not safe for people or animals.',
  'contact-details': 'The listing leads buyers around this site.',
  'wild-caught': 'Wild-caught animals are not listed here.',
  other: '',
}
