import type { BatchShipping, FishBody } from '@/shared/contracts/fish-batch'

/** A batch as it stands in the form: figures are the words the seller typed, '' is not answered yet. */
export interface BatchTyping {
  taxonId: string
  strain: string
  stage: FishBody['stage'] | ''
  sizeLoMm: string
  sizeHiMm: string
  ungraded: boolean
  hatchedOn: string
  readyOn: string
  countOnHand: string
  minOrder: string
  orderStep: string
  mostPerBuyer: string
  tiers: TierTyping[]
  countMethod: FishBody['countMethod'] | ''
  overcountPct: string
  sex: FishBody['sex'] | ''
  sexClaimPct: string
  feed: { onPellets: boolean; since: string; words: string }
  water: {
    temperatureC: string
    pH: string
    ghPpm: string
    khPpm: string
    saltPpt: string
    source: FishBody['water']['source'] | ''
    measuredOn: string
  }
  origin: FishBody['origin'] | ''
  originState: string
  wildCaught: 'no' | 'yes' | ''
  health: { treatments: string; lastLosses: string; papers: string }
  singleSpeciesChecked: boolean
  licenceNumbers: string
  statesServed: string[]
  placeKind: FishBody['placeKind'] | ''
  windows: WindowTyping[]
  accept: FishBody['accept']
  balanceDue: FishBody['balanceDue']
  depositPct: string
  freeCancelHours: string
  promise: {
    windowHours: string
    survivalDays: string
    remedy: FishBody['promise']['remedy']
    evidence: string
  }
  shipping: {
    isOffered: boolean
    packing: BatchShipping['packing'] | ''
    boxCents: string
    freightCents: string
    carrier: string
    carrierAccepts: boolean
    holdsAtCounter: boolean
    mostInBox: string
    days: string[]
  }
  photos: PhotoTyping[]
  words: string
}

export interface TierTyping {
  fromCount: string
  unitCents: string
}

export interface WindowTyping {
  day: string
  from: string
  until: string
  capacity: string
}

export interface PhotoTyping {
  photoId: string
  takenOn: string
  hasRuler: boolean
  caption: string
}
