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
