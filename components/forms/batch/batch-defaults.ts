import type { BatchTyping } from './batch-typing'

interface Given {
  ownState: string
  licenceNumbers: string
}

// What only the seller can state (origin, count method, one species, not wild) is never answered for them.
/** What a new batch starts with: the usual practice of small hatcheries, so that most terms need only a glance. */
export function batchDefaults({ ownState, licenceNumbers }: Given): BatchTyping {
  return {
    taxonId: '',
    strain: '',
    stage: '',
    sizeLoMm: '',
    sizeHiMm: '',
    ungraded: false,
    hatchedOn: '',
    readyOn: '',
    countOnHand: '',
    minOrder: '25',
    orderStep: '5',
    mostPerBuyer: '',
    tiers: [{ fromCount: '25', unitCents: '' }],
    countMethod: '',
    overcountPct: '5',
    sex: 'unknown',
    sexClaimPct: '',
    feed: { onPellets: true, since: '', words: '' },
    water: { temperatureC: '', pH: '', ghPpm: '', khPpm: '', saltPpt: '0', source: '', measuredOn: '' },
    origin: '',
    originState: '',
    wildCaught: '',
    health: { treatments: '', lastLosses: '', papers: '' },
    singleSpeciesChecked: false,
    licenceNumbers,
    statesServed: ownState ? [ownState] : [],
    placeKind: 'farm-gate',
    windows: [],
    accept: 'ask',
    balanceDue: 'at-handover',
    depositPct: '25',
    freeCancelHours: '72',
    promise: {
      windowHours: '24',
      survivalDays: '0',
      remedy: 'refund',
      evidence: 'A photo of every dead fish, beside the bag if there was one',
    },
    shipping: {
      isOffered: false,
      packing: '',
      boxCents: '',
      freightCents: '',
      carrier: '',
      carrierAccepts: false,
      holdsAtCounter: false,
      mostInBox: '',
      days: [],
    },
    photos: [],
    words: '',
  }
}

/** The same shape with nothing answered: a saved draft shows what was saved, and no default slips in again. */
export function batchBlank(): BatchTyping {
  const usual = batchDefaults({ ownState: '', licenceNumbers: '' })
  return {
    ...usual,
    minOrder: '',
    orderStep: '',
    tiers: [],
    overcountPct: '',
    sex: '',
    feed: { onPellets: false, since: '', words: '' },
    water: { ...usual.water, saltPpt: '' },
    placeKind: '',
    depositPct: '',
    freeCancelHours: '',
    promise: { windowHours: '', survivalDays: '', remedy: 'refund', evidence: '' },
  }
}
