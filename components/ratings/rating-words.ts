import type { HidingReason, Marks } from '@/shared/contracts/ratings'
import type { SurvivalRecord } from '@/shared/contracts/sellers'
import { printCount } from '@/shared/units/count'

export const markNames: Record<keyof Marks, string> = {
  fish: 'Fish quality',
  count: 'Honest count',
  contact: 'Communication',
}
export const markKeys = ['fish', 'count', 'contact'] as const

export const markChoices = [
  { value: '5', label: '5, very good' },
  { value: '4', label: '4, good' },
  { value: '3', label: '3, fair' },
  { value: '2', label: '2, poor' },
  { value: '1', label: '1, bad' },
] as const

export const hidingWords: Record<HidingReason, string> = {
  'personal-data': 'personal data',
  threats: 'threats',
  'not-this-order': 'not about this order',
}

/** "Words hidden by a moderator: personal data". */
export function hiddenWords(reason: HidingReason): string {
  return `Words hidden by a moderator: ${hidingWords[reason]}`
}

/** "Alive after 7 days: 188 of 200 fish, 9 of 11 orders answered"; '' before the first question. */
export function survivalWords(record: SurvivalRecord | undefined): string {
  if (!record) return ''
  const { alive, handedOver, answered, asked } = record
  const orders = `${printCount(answered)} of ${printCount(asked)} ${asked === 1 ? 'order' : 'orders'} answered`
  return answered === 0
    ? `Alive after 7 days: not told yet, ${orders}`
    : `Alive after 7 days: ${printCount(alive)} of ${printCount(handedOver)} fish, ${orders}`
}
