import { TZDate } from '@date-fns/tz'

import type { MediaBody } from '@/shared/contracts/media-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'

const DAY_MS = 86_400_000

/** The day at the farm, some days after a moment. */
export const dayAt = (at: Date, daysLater: number) =>
  new TZDate(at.getTime() + daysLater * DAY_MS, 'America/New_York').toISOString().slice(0, 10)

const shared = (at: Date, photoId: string) => ({
  placeKind: 'farm-gate' as const,
  windows: [{ day: dayAt(at, 1), from: '17:00', until: '19:00', capacity: 20 }],
  accept: 'instant' as const,
  balanceDue: 'before' as const,
  photos: [{ photoId, takenOn: dayAt(at, 0), hasRuler: false }],
  words: '',
})

const NO_PHOTO = '0'.repeat(32)

/** Fourteen heads, cut today and collected tomorrow from five to seven. */
export const lettuceOf = (at: Date, photoId = NO_PHOTO, change: Partial<ProduceBody> = {}): ProduceBody => ({
  category: 'produce',
  cropId: 'leaf_lettuce',
  form: 'whole',
  saleUnit: { kind: 'head' },
  harvest: { day: dayAt(at, 0), time: '07:30' },
  handling: { touchesSystemWater: 'no', rinsedInDrinkingWater: true, heldC: 1, coldAtPickup: true },
  growing: 'On rafts, in fish water.',
  standing: 'not-covered',
  countOnHand: 14,
  minOrder: 1,
  orderStep: 1,
  tiers: [{ fromCount: 1, unitCents: 300 }],
  depositPct: 100,
  freeCancelHours: 12,
  ...shared(at, photoId),
  ...change,
})

/** Packs of 250 red wigglers, raised here. */
export const wigglersOf = (at: Date, photoId = NO_PHOTO, change: Partial<WormBody> = {}): WormBody => ({
  category: 'worms',
  taxonId: 'red_wiggler',
  grading: 'bed-run',
  bedding: 'Damp coir',
  saleUnit: { kind: 'pack', count: 250 },
  countMethod: 'sample-weight',
  overcountPct: 5,
  raisedInUs: true,
  lotChecked: true,
  origin: 'hatched-here',
  wildCaught: false,
  licenceNumbers: 'None needed for worms raised in the state',
  statesServed: ['OH', 'KY'],
  promise: { windowHours: 12, survivalDays: 0, remedy: 'refund', evidence: 'A photo of the open pack' },
  countOnHand: 20,
  minOrder: 1,
  orderStep: 1,
  tiers: [
    { fromCount: 1, unitCents: 1600 },
    { fromCount: 4, unitCents: 1400 },
  ],
  depositPct: 30,
  freeCancelHours: 24,
  ...shared(at, photoId),
  ...change,
})

/** Fifty litres of expanded clay a bag. */
export const clayOf = (at: Date, photoId = NO_PHOTO, change: Partial<MediaBody> = {}): MediaBody => ({
  category: 'media',
  material: 'expanded_clay',
  saleUnit: { kind: 'volume', litres: 50, weightKg: 18 },
  grainLoMm: 8,
  grainHiMm: 16,
  rinsed: true,
  vinegarTest: 'no-fizz',
  used: 'new',
  countOnHand: 12,
  minOrder: 1,
  orderStep: 1,
  tiers: [{ fromCount: 1, unitCents: 3000 }],
  depositPct: 20,
  freeCancelHours: 24,
  ...shared(at, photoId),
  ...change,
  balanceDue: change.balanceDue ?? 'at-handover',
})
