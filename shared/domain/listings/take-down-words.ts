import type { TakeDownReason } from '@/shared/domain/listings/take-down-reasons'

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
