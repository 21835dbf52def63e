import { day, freeText, number, oneOf, some, time, whole, yesNo, type LotRule } from './lot-shape'

const million = 1_000_000
const mostCents = 10_000_000

interface Deposit {
  least: number
  most: number
  leastFreeHours: number
}

/** The answers every listing of worms, media and produce has; what is asked is what the contract asks. */
export const commonRules = ({ least, most, leastFreeHours }: Deposit): LotRule[] => [
  { path: 'countOnHand', fits: whole(1, million), ask: 'How many are there to sell?' },
  { path: 'minOrder', fits: whole(1, million), ask: 'The smallest order.' },
  { path: 'orderStep', fits: whole(1, million), ask: 'Sold in steps of how many?' },
  {
    path: 'mostPerBuyer',
    fits: (value) => value === undefined || whole(1, million)(value),
    ask: 'A number, or leave it empty.',
  },
  { path: 'tiers', fits: some(8), ask: 'Give at least one price.' },
  { path: 'tiers.*.fromCount', fits: whole(1, million), ask: 'From how many?' },
  {
    path: 'tiers.*.unitCents',
    fits: whole(1, mostCents),
    ask: 'A price for one unit, in dollars and cents.',
  },
  {
    path: 'placeKind',
    fits: oneOf(['farm-gate', 'public-place']),
    ask: 'Where do people collect?',
  },
  { path: 'windows', fits: some(40), ask: 'Offer at least one pickup window.' },
  { path: 'windows.*.day', fits: day, ask: 'Which day? Pick one from the calendar.' },
  { path: 'windows.*.from', fits: time, ask: 'A time, like 09:00.' },
  { path: 'windows.*.until', fits: time, ask: 'A time, like 09:00.' },
  { path: 'windows.*.capacity', fits: whole(1, 500), ask: 'How many buyers fit?' },
  {
    path: 'accept',
    fits: oneOf(['instant', 'ask']),
    ask: 'Do you accept each order yourself, or take them at once?',
  },
  {
    path: 'balanceDue',
    fits: oneOf(['at-handover', 'before']),
    ask: 'Is the rest paid at the hand-over, or before it?',
  },
  { path: 'depositPct', fits: whole(least, most), ask: `A deposit of ${least} to ${most} %.` },
  {
    path: 'freeCancelHours',
    fits: whole(leastFreeHours, 336),
    ask: `Until how many hours before may buyers cancel for free? ${leastFreeHours} to 336.`,
  },
  { path: 'photos', fits: some(6), ask: 'At least one photo of what you sell.' },
  { path: 'photos.*.takenOn', fits: day, ask: 'On which day was the photo taken?' },
  { path: 'photos.*.hasRuler', fits: yesNo, ask: 'Is a ruler in the photo? No is an answer.' },
  { path: 'photos.*.caption', fits: freeText(120), ask: 'At most 120 characters.' },
  {
    path: 'words',
    fits: (value) => typeof value === 'string' && value.trim().length <= 2000,
    ask: 'Tell buyers what they should know, or leave it empty.',
  },
]

const weighed = 'A net weight with its unit, like 8 oz or 250 g, without box or root ball.'
export const netWeight: LotRule = {
  path: 'saleUnit.netG',
  fits: number(1, million),
  ask: weighed,
  when: ({ saleUnit }) => kindOf(saleUnit) === 'weight',
}
/** A bunch may say its weight; said, it must be one. */
export const bunchWeight: LotRule = {
  path: 'saleUnit.netG',
  fits: (value) => value === undefined || number(1, million)(value),
  ask: weighed,
  when: ({ saleUnit }) => kindOf(saleUnit) === 'bunch',
}

export function kindOf(saleUnit: unknown): unknown {
  return typeof saleUnit === 'object' && saleUnit !== null && 'kind' in saleUnit ? saleUnit.kind : undefined
}
