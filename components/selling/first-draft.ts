import type { SupplyKind } from '@/components/forms/supplies/supply-kind'
import type { ListingDraft } from '@/shared/contracts/listings'

interface Given {
  ownState: string
  licenceNumbers: string
  /** The seller's last listing of this kind, if there was one. */
  last: ListingDraft | undefined
}

// How the farm works does not change from one harvest to the next; what is said about one harvest is asked anew.
const remembered: Record<SupplyKind, readonly string[]> = {
  produce: [
    'handling',
    'growing',
    'organic',
    'organicCertifier',
    'standing',
    'farm',
    'placeKind',
    'accept',
    'balanceDue',
    'depositPct',
    'freeCancelHours',
  ],
  worms: [
    'bedding',
    'licenceNumbers',
    'statesServed',
    'promise',
    'overcountPct',
    'countMethod',
    'placeKind',
    'accept',
    'balanceDue',
    'depositPct',
    'freeCancelHours',
  ],
  media: ['placeKind', 'accept', 'balanceDue', 'depositPct', 'freeCancelHours'],
}

const oneByOne = { minOrder: 1, orderStep: 1, tiers: [{ fromCount: 1 }], words: '' }

const usual: Record<SupplyKind, ListingDraft> = {
  // Small sums of what spoils are paid at once: two charges cost more than they protect.
  produce: {
    ...oneByOne,
    placeKind: 'farm-gate',
    accept: 'instant',
    balanceDue: 'before',
    depositPct: 100,
    freeCancelHours: 12,
  },
  worms: {
    ...oneByOne,
    placeKind: 'farm-gate',
    accept: 'ask',
    balanceDue: 'at-handover',
    depositPct: 25,
    freeCancelHours: 48,
    overcountPct: 5,
    promise: {
      windowHours: 24,
      survivalDays: 0,
      remedy: 'refund',
      evidence: 'A photo of the open bag',
    },
  },
  media: {
    ...oneByOne,
    placeKind: 'farm-gate',
    accept: 'instant',
    balanceDue: 'at-handover',
    depositPct: 20,
    freeCancelHours: 24,
  },
}

/** What a new listing begins with: the usual terms, over them what the farm said last time. */
export function firstDraft(kind: SupplyKind, { ownState, licenceNumbers, last }: Given): ListingDraft {
  const legal = kind === 'worms' ? { licenceNumbers, statesServed: ownState ? [ownState] : [] } : {}
  const kept = Object.fromEntries(
    Object.entries(last ?? {}).filter(([field]) => remembered[kind].includes(field)),
  )
  return { category: kind, ...usual[kind], ...legal, ...kept }
}

/** The next lot like this one: harvested today, with a code of its own. */
export function nextHarvest(copy: ListingDraft, now: { day: string; time: string }): ListingDraft {
  const {
    lotCode: _code,
    sellBy: _day,
    windows: _windows,
    photos: _photos,
    countOnHand: _count,
    ...kept
  } = copy
  const was = typeof copy.harvest === 'object' && copy.harvest !== null ? copy.harvest : {}
  const bed = 'bed' in was && typeof was.bed === 'string' ? { bed: was.bed } : {}
  return { ...kept, harvest: { ...now, ...bed } }
}
