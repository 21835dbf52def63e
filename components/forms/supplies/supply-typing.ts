import type { PhotoTyping, TierTyping, WindowTyping } from '@/components/forms/batch/batch-typing'
import type { OrganicClaim } from '@/shared/domain/produce/judge-words'

type YesNo = 'yes' | 'no' | ''

/** What the three forms have in common: figures are the words typed, '' is not answered yet. */
export interface SupplyTyping {
  /** Of the parts only those stand in the draft that the kind asks for. */
  saleUnit: { kind: string; netG: string; count: string; litres: string; weightKg: string }
  countOnHand: string
  minOrder: string
  orderStep: string
  mostPerBuyer: string
  tiers: TierTyping[]
  placeKind: string
  windows: WindowTyping[]
  accept: string
  balanceDue: string
  depositPct: string
  freeCancelHours: string
  photos: PhotoTyping[]
  words: string
}

export interface ProduceTyping extends SupplyTyping {
  cropId: string
  variety: string
  form: string
  harvest: { day: string; time: string; bed: string }
  sellBy: string
  handling: { touchesSystemWater: string; rinsedInDrinkingWater: YesNo; heldC: string; coldAtPickup: YesNo }
  growing: string
  organic: OrganicClaim | ''
  organicCertifier: string
  standing: string
}

export interface WormTyping extends SupplyTyping {
  taxonId: string
  strain: string
  grading: string
  sizeLoMm: string
  sizeHiMm: string
  bedding: string
  countMethod: string
  overcountPct: string
  raisedInUs: YesNo
  lotChecked: boolean
  origin: string
  originState: string
  wildCaught: YesNo
  licenceNumbers: string
  statesServed: string[]
  promise: { windowHours: string; survivalDays: string; remedy: string; evidence: string }
}

export interface MediaTyping extends SupplyTyping {
  material: string
  materialWords: string
  grainLoMm: string
  grainHiMm: string
  rinsed: YesNo
  vinegarTest: string
  used: string
  usedWords: string
  heatTreated: string
}
