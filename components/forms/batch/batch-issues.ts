import { fishBody, type FishBody } from '@/shared/contracts/fish-batch'
import type { ListingDraft } from '@/shared/contracts/listings'
import { stageFitsLength } from '@/shared/domain/species/stage-fits-length'
import type { Stage } from '@/shared/domain/species/stages.facts'
import type { z } from 'zod'

// Passes every rule whatever stands beside it. Rules that compare two fields are only asked once all fields can be
// read; answers still missing are lent from here, so that a price that does not fall is told at once.
const lent: Record<string, unknown> = {
  category: 'fish',
  taxonId: 'lent',
  stage: 'fingerling',
  sizeLoMm: 25.4,
  sizeHiMm: 25.4,
  ungraded: true,
  hatchedOn: '2026-01-01',
  countOnHand: 1_000_000,
  minOrder: 1_000_000,
  orderStep: 1,
  tiers: [{ fromCount: 1, unitCents: 1 }],
  countMethod: 'hand',
  overcountPct: 0,
  sex: 'unknown',
  feed: { onPellets: true },
  water: {
    temperatureC: 20,
    pH: 7,
    ghPpm: 0,
    khPpm: 0,
    saltPpt: 0,
    source: 'well',
    measuredOn: '2026-01-01',
  },
  origin: 'hatched-here',
  wildCaught: false,
  health: { treatments: '-', lastLosses: '-' },
  singleSpeciesChecked: true,
  licenceNumbers: '-',
  statesServed: ['OH'],
  placeKind: 'farm-gate',
  windows: [{ day: '2026-01-01', from: '09:00', until: '10:00', capacity: 1 }],
  accept: 'ask',
  balanceDue: 'at-handover',
  depositPct: 25,
  freeCancelHours: 72,
  promise: { windowHours: 24, survivalDays: 0, remedy: 'refund', evidence: '-' },
  photos: [{ photoId: '0'.repeat(32), takenOn: '2026-01-01', hasRuler: true }],
  words: '',
} satisfies Record<keyof Omit<FishBody, OptionalField>, unknown>

type OptionalField = 'strain' | 'readyOn' | 'mostPerBuyer' | 'sexClaimPct' | 'originState' | 'shipping'

/** Everything the contract has to say about a draft, the rules between fields included. Empty: it may be published. */
export function batchIssues(draft: ListingDraft): z.core.$ZodIssue[] {
  const read = fishBody.safeParse(draft, { reportInput: true })
  if (read.success) return stageIssues(draft)
  const wrong = new Set(read.error.issues.map((issue) => String(issue.path[0])))
  const known = Object.fromEntries(Object.entries(draft).filter(([field]) => !wrong.has(field)))
  const completed = {
    ...Object.fromEntries(Object.entries(lent).filter(([field]) => wrong.has(field))),
    ...known,
  }
  const between = fishBody.safeParse(completed, { reportInput: true })
  const also = between.success
    ? []
    : between.error.issues.filter((issue) => !wrong.has(String(issue.path[0])))
  return [...read.error.issues, ...also, ...stageIssues(draft)]
}

const mmPerInch = 25.4

/** The server refuses a stage that the lengths contradict; the same function says so here. */
function stageIssues({ stage, sizeLoMm, sizeHiMm }: ListingDraft): z.core.$ZodIssue[] {
  if (typeof sizeLoMm !== 'number' || typeof sizeHiMm !== 'number') return []
  if (stageFitsLength(stage as Stage['id'], sizeLoMm / mmPerInch, sizeHiMm / mmPerInch) !== false) return []
  const message = 'That word does not fit the lengths you gave: choose another stage or check the size.'
  return [{ code: 'custom', path: ['stage'], message, input: stage }]
}
