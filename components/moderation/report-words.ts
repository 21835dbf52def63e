import type { Choice } from '@/components/ui/choice'
import type { ReportReason } from '@/shared/contracts/listing-reports'
import type { TakeDownReason } from '@/shared/domain/listings/take-down-reasons'

/** What a member says is wrong, as the desk reads it. */
export const reportLabels: Record<ReportReason, string> = {
  species: 'Wrong or unlisted species',
  'not-as-told': 'Not what it says',
  'bad-state': 'Animals in a bad state',
  unlawful: 'Unsafe or unlawful',
  'contact-details': 'Goes around the site',
  other: 'Something else',
}

const takeDownLabels: Record<TakeDownReason, string> = {
  'species-blocked': 'We do not list this species',
  'not-as-told': 'Not what the listing says',
  'bad-state': 'Animals in a bad state',
  unlawful: 'Unsafe or unlawful offer',
  'contact-details': 'Leads buyers around this site',
  'wild-caught': 'Wild-caught',
  other: 'Something else',
}
const reasons = Object.keys(takeDownLabels) as TakeDownReason[]

/** Each reason with the number key that chooses it in front. */
export const takeDownChoices: readonly Choice<TakeDownReason>[] = reasons.map((value, at) => ({
  value,
  label: `${at + 1}  ${takeDownLabels[value]}`,
}))

/** The reason a number key chooses. undefined: none. */
export function takeDownReasonOf(key: string): TakeDownReason | undefined {
  return /^[1-9]$/.test(key) ? reasons[Number(key) - 1] : undefined
}

export function peopleWords(people: number): string {
  return people === 1 ? '1 member reports it' : `${people} members report it`
}

/** What becomes of the orders made from it. */
export function ordersWords(openOrders: number): string {
  if (openOrders === 0) return 'No order is open from it.'
  return openOrders === 1
    ? 'One order is open from it. It is not touched: buyer and seller go on as agreed.'
    : `${openOrders} orders are open from it. They are not touched: buyers and seller go on as agreed.`
}
