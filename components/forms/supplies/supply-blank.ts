import type { SupplyKind } from './supply-kind'
import type { MediaTyping, ProduceTyping, SupplyTyping, WormTyping } from './supply-typing'

const common: SupplyTyping = {
  saleUnit: { kind: '', netG: '', count: '', litres: '', weightKg: '' },
  countOnHand: '',
  minOrder: '',
  orderStep: '',
  mostPerBuyer: '',
  tiers: [],
  placeKind: '',
  windows: [],
  accept: '',
  balanceDue: '',
  depositPct: '',
  freeCancelHours: '',
  photos: [],
  words: '',
}

const produce: ProduceTyping = {
  ...common,
  cropId: '',
  variety: '',
  form: '',
  harvest: { day: '', time: '', bed: '' },
  sellBy: '',
  handling: { touchesSystemWater: '', rinsedInDrinkingWater: '', heldC: '', coldAtPickup: '' },
  growing: '',
  organic: '',
  organicCertifier: '',
  standing: '',
}

const worms: WormTyping = {
  ...common,
  taxonId: '',
  strain: '',
  grading: '',
  sizeLoMm: '',
  sizeHiMm: '',
  bedding: '',
  countMethod: '',
  overcountPct: '',
  raisedInUs: '',
  lotChecked: false,
  origin: '',
  originState: '',
  wildCaught: '',
  licenceNumbers: '',
  statesServed: [],
  promise: { windowHours: '', survivalDays: '', remedy: '', evidence: '' },
}

const media: MediaTyping = {
  ...common,
  material: '',
  materialWords: '',
  grainLoMm: '',
  grainHiMm: '',
  rinsed: '',
  vinegarTest: '',
  used: '',
  usedWords: '',
  heatTreated: '',
}

const blanks = { produce, worms, media }

/** The shape of each form with nothing answered. */
export const supplyBlank = (kind: SupplyKind): SupplyTyping => blanks[kind]
