import type { FishBody } from '@/shared/contracts/fish-batch'

const DAY_MS = 86_400_000
const day = (at: Date, daysLater: number) =>
  new Date(at.getTime() + daysLater * DAY_MS).toISOString().slice(0, 10)

/** A sound batch of bluegill as of `at`; whatever is given takes the place of what stands here. */
export function batchBody(at: Date, change: Partial<FishBody>): FishBody {
  return {
    category: 'fish',
    taxonId: 'bluegill',
    stage: 'fingerling',
    sizeLoMm: 50.8,
    sizeHiMm: 76.2,
    ungraded: false,
    hatchedOn: day(at, -120),
    countOnHand: 500,
    minOrder: 25,
    orderStep: 5,
    tiers: [
      { fromCount: 25, unitCents: 100 },
      { fromCount: 100, unitCents: 89 },
    ],
    countMethod: 'hand',
    overcountPct: 5,
    sex: 'mixed',
    feed: { onPellets: true, words: '2 mm floating pellets, 40 % protein' },
    water: {
      temperatureC: 21,
      pH: 7.4,
      ghPpm: 180,
      khPpm: 120,
      saltPpt: 0,
      source: 'well',
      measuredOn: day(at, -3),
    },
    origin: 'hatched-here',
    wildCaught: false,
    health: { treatments: 'None', lastLosses: 'None since the last grading' },
    singleSpeciesChecked: true,
    licenceNumbers: 'Class A 1142',
    statesServed: ['OH', 'KY', 'IN'],
    placeKind: 'farm-gate',
    windows: [{ day: day(at, 7), from: '09:00', until: '10:00', capacity: 6 }],
    accept: 'instant',
    balanceDue: 'at-handover',
    depositPct: 25,
    freeCancelHours: 72,
    promise: { windowHours: 24, survivalDays: 0, remedy: 'refund', evidence: 'A photo of each dead fish' },
    photos: [{ photoId: '0'.repeat(32), takenOn: day(at, -2), hasRuler: true }],
    words: 'Graded last week, eating well.',
    ...change,
  }
}
