import { checkShape, type LotIssue, type LotRule } from './lot-shape'
import { mediaRules } from './media-rules'
import { produceRules } from './produce-rules'
import { wormRules } from './worm-rules'

import type { SupplyKind } from '@/components/forms/supplies/supply-kind'
import type { Wrong } from '@/shared/contracts/check-lot'
import { checkMedia } from '@/shared/contracts/check-media'
import { checkProduce } from '@/shared/contracts/check-produce'
import { checkWorms } from '@/shared/contracts/check-worms'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { MediaBody } from '@/shared/contracts/media-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'

// Stand where an answer is still missing, so that the rules between the others can be asked at once.
const lent = {
  countOnHand: 1_000_000,
  minOrder: 1_000_000,
  orderStep: 1,
  tiers: [{ fromCount: 1, unitCents: 1_000_000 }],
  windows: [],
  photos: [],
  words: '',
  depositPct: 100,
}
const lentProduce = {
  ...lent,
  cropId: 'leaf_lettuce',
  form: 'whole',
  saleUnit: { kind: 'head' },
  harvest: { day: '2026-01-01', time: '07:00' },
  handling: { touchesSystemWater: 'no', rinsedInDrinkingWater: true, heldC: 1, coldAtPickup: true },
  growing: '-',
  standing: 'covered',
}
const lentWorms = {
  ...lent,
  taxonId: 'red_wiggler',
  grading: 'bed-run',
  saleUnit: { kind: 'weight', netG: 1 },
  raisedInUs: true,
  lotChecked: true,
  origin: 'hatched-here',
}
const lentMedia = { ...lent, material: 'vermiculite', saleUnit: { kind: 'weight', netG: 1 }, used: 'new' }

// What is said of these rests on that: with that lent, nothing is said of them.
const restsOn: Readonly<Record<string, readonly string[]>> = {
  cropId: ['saleUnit', 'handling.heldC', 'handling.coldAtPickup', 'sellBy', 'windows'],
  form: ['handling.heldC', 'handling.coldAtPickup', 'sellBy', 'windows'],
  'harvest.day': ['sellBy', 'windows'],
  'handling.heldC': ['sellBy', 'windows'],
  countOnHand: ['minOrder'],
  minOrder: ['mostPerBuyer', 'tiers', 'depositPct'],
  tiers: ['depositPct'],
  saleUnit: ['countMethod'],
  material: ['grainLoMm', 'grainHiMm', 'rinsed', 'vinegarTest', 'heatTreated'],
}

interface Asked {
  rules: readonly LotRule[]
  lent: ListingDraft
  between: (lot: ListingDraft, wrong: Wrong) => void
}

// Each part has been looked at by the rules, or is lent: what is handed on has the shape of a body.
const asked: Record<SupplyKind, Asked> = {
  produce: {
    rules: produceRules,
    lent: lentProduce,
    between: (lot, wrong) => checkProduce(lot as unknown as ProduceBody, wrong),
  },
  worms: {
    rules: wormRules,
    lent: lentWorms,
    between: (lot, wrong) => checkWorms(lot as unknown as WormBody, wrong),
  },
  media: {
    rules: mediaRules,
    lent: lentMedia,
    between: (lot, wrong) => checkMedia(lot as unknown as MediaBody, wrong),
  },
}

/** Everything to be said about a draft before it is sent. The contract on the server has the last word; a test holds both together. */
export function lotIssues(kind: SupplyKind, draft: ListingDraft): LotIssue[] {
  const { rules, lent: standIn, between } = asked[kind]
  const found = checkShape(draft, rules)
  const wrong = new Set(found.flatMap(({ path }) => [String(path[0]), path.join('.')]))
  const unsaid = new Set([...wrong].flatMap((field) => [field, ...(restsOn[field] ?? [])]))
  const also: LotIssue[] = []
  between(complete(draft, standIn, wrong), (path, message) => {
    if (!unsaid.has(path.length > 1 && isGroup(draft[String(path[0])]) ? path.join('.') : String(path[0])))
      also.push({ path, message })
  })
  return [...found, ...also]
}

const isGroup = (value: unknown): value is ListingDraft =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** The draft with what is wrong in it replaced by what is lent; of a group only the wrong parts are. */
function complete(draft: ListingDraft, standIn: ListingDraft, wrong: ReadonlySet<string>): ListingDraft {
  const kept = Object.entries(draft).flatMap(([field, value]): [string, unknown][] => {
    const lentPart = standIn[field]
    if (!wrong.has(field)) return [[field, value]]
    if (field === 'saleUnit' || !isGroup(value) || !isGroup(lentPart)) return []
    const right = Object.entries(value).filter(([part]) => !wrong.has(`${field}.${part}`))
    return [[field, { ...lentPart, ...Object.fromEntries(right) }]]
  })
  const missing = Object.entries(standIn).filter(([field]) => wrong.has(field))
  return { ...Object.fromEntries(missing), ...Object.fromEntries(kept) }
}
