import {
  advice,
  captions,
  evidences,
  extras,
  losses,
  openings,
  treatments,
} from '@/seed/demo/batch-words.facts'
import type { BatchPlan, Shot } from '@/seed/demo/batch-plan'
import { dayPlus, slotsOf, type Rhythm } from '@/seed/demo/pickup-times'
import { need, type Farm, type Stage } from '@/seed/demo/stage'
import { stockFacts, type StockFacts } from '@/seed/demo/stock.facts'
import { after, DAY_MS, HOUR_MS } from '@/seed/demo/timeline'
import { picturePlans, type PicturePlan } from '@/seed/pictures/picture-plan.facts'
import { seededRandom, type Chance } from '@/seed/seeded-random'
import { dayOf } from '@/server/listings/day-of'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import { animalClassOf } from '@/shared/domain/season/season-lane'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import type { TaxonId } from '@/shared/domain/species/taxa.facts'

const MM_PER_INCH = 25.4
/** The form takes forty; a few are left for windows that an order needs. */
const MOST_WINDOWS = 34

const rhythms: readonly Rhythm[] = [
  { weekdays: [6], from: '09:00', until: '10:00', capacity: 6 },
  { weekdays: [3, 6], from: '17:00', until: '17:45', capacity: 4 },
  { weekdays: [0], from: '13:00', until: '14:00', capacity: 5 },
  { weekdays: [2, 5], from: '08:00', until: '08:45', capacity: 4 },
  { weekdays: [4], from: '16:30', until: '17:30', capacity: 6 },
]

export interface BatchWish {
  key: string
  farm: Farm
  taxonId: TaxonId
  /** How many days before the demo's moment it was submitted. */
  daysAgo: number
  /** The picture's name, where it matters. */
  picture?: string
}

function priceTiers(
  stock: StockFacts,
  { minOrder, count }: { minOrder: number; count: number },
  chance: Chance,
) {
  const exact = chance.between(...stock.cents)
  const unitCents = exact >= 50 ? Math.round(exact / 5) * 5 : Math.round(exact)
  const steps = [
    [1, 1],
    [4, 0.88],
    [20, 0.7],
  ] as const
  return steps
    .map(([times, share]) => ({ fromCount: minOrder * times, unitCents: Math.floor(unitCents * share) }))
    .filter((tier, at) => at === 0 || tier.fromCount <= count)
}

function stageOf([low, high]: PicturePlan['sizeIn'], taxonId: TaxonId) {
  if (taxonId === 'redclaw_crayfish' || taxonId === 'freshwater_prawn') return 'juvenile'
  if (low >= 4 && taxonId !== 'common_carp_koi') return 'advanced-fingerling'
  return high <= 4 ? 'fingerling' : 'juvenile'
}

/** The last day before `day`, by at least that many days, that lies in a month in which the kind hatches. */
function hatchDay(stock: StockFacts, day: string, leastAgeDays: number): string {
  let hatched = dayPlus(day, -leastAgeDays)
  while (!stock.hatchMonths.includes(Number(hatched.slice(5, 7)))) hatched = dayPlus(hatched, -1)
  return hatched
}

function licenceText({ facts }: Farm): string {
  if (facts.licence === 'have')
    return `${facts.state} aquaculture permit ${facts.state}-${facts.zip.slice(1)}`
  return facts.licence === 'unsure'
    ? 'Not sure, the office has not written back'
    : 'None needed for a few fish of our own'
}

function shotsOf(wish: BatchWish, first: PicturePlan, day: string): Shot[] {
  const chance = seededRandom(`shots ${wish.key}`)
  const others = picturePlans.filter(
    (one) =>
      one.taxonId === wish.taxonId &&
      one.name !== first.name &&
      one.ruler !== null &&
      one.sizeIn[1] === first.sizeIn[1],
  )
  const pictures = [
    first,
    ...(chance.happens(0.1) ? [first] : []),
    ...others.slice(0, chance.happens(0.25) ? 1 : 0),
  ]
  const takenOn = dayPlus(day, -chance.whole(0, 4))
  return pictures.map((picture, at) => ({
    picture: picture.name,
    hasRuler: picture.ruler !== null || at === 0,
    takenOn,
    framing: `${wish.key} ${at}`,
    ...(at > 0 || chance.happens(0.6) ? { caption: chance.pick(captions) } : {}),
  }))
}

/** A third of the batches can be shipped; drawn apart, so that everything else about them stays as it was. */
function shippingOf({ key, taxonId }: BatchWish, minOrder: number): Pick<BatchPlan['body'], 'shipping'> {
  const chance = seededRandom(`shipping ${key}`)
  const speciesId = findTaxon(taxonId)?.speciesId
  if (!chance.happens(1 / 3) || !speciesId || !animalClassOf(speciesId)) return {}
  // Mostly the thick box overnight: by the season table little else is ever safe.
  const packing = chance.happens(0.8)
    ? 'foam-38-overnight'
    : chance.pick(['foam-25-overnight', 'foam-38-two-days'] as const)
  const isTwoDays = packingClasses[packing].nights > 1
  return {
    shipping: {
      packing,
      boxCents: chance.pick([800, 1000, 1200, 1500]),
      freightCents: isTwoDays ? chance.pick([1400, 1800, 2200]) : chance.pick([4500, 4800, 5500, 6200]),
      carrier: isTwoDays ? 'Parcel post, two days' : 'Overnight air, by noon',
      carrierAccepts: true,
      holdsAtCounter: chance.happens(0.8),
      mostInBox: minOrder * chance.whole(2, 6),
      days: isTwoDays || chance.happens(0.4) ? ['mon', 'tue'] : ['mon', 'tue', 'wed'],
    },
  }
}

/** A sound batch of that farm and kind, as its seller would have typed it that day. */
export function planBatch(stage: Stage, wish: BatchWish): BatchPlan {
  const { key, farm, taxonId, daysAgo } = wish
  const chance = seededRandom(`batch ${key}`)
  const stock = need(
    stockFacts.find((one) => one.taxonId === taxonId),
    `stock facts of ${taxonId}`,
  )
  const pictures = picturePlans.filter(
    (one) => one.taxonId === taxonId && (wish.picture ? one.name === wish.picture : one.ruler !== null),
  )
  const picture = chance.pick(pictures)
  const submittedAt = after(stage.at, -daysAgo * DAY_MS - chance.between(1, 9) * HOUR_MS)
  const day = dayOf(submittedAt, farm.zone)
  const minOrder = chance.pick(stock.leastOrders)
  const count = chance.whole(...stock.counts)
  const meanIn = (picture.sizeIn[0] + picture.sizeIn[1]) / 2
  const own = farm.facts.state
  const span = { after: after(submittedAt, 2 * DAY_MS), until: after(stage.at, 36 * DAY_MS) }
  return {
    ...{ key, farm, submittedAt },
    decidedAt: after(submittedAt, chance.between(2, 19) * HOUR_MS),
    slots: slotsOf(chance.pick(rhythms), span, farm.zone).slice(-MOST_WINDOWS),
    shots: shotsOf(wish, picture, day),
    body: {
      ...{ category: 'fish', taxonId, stage: stageOf(picture.sizeIn, taxonId), ungraded: false },
      ...(stock.strain ? { strain: stock.strain } : {}),
      sizeLoMm: picture.sizeIn[0] * MM_PER_INCH,
      sizeHiMm: picture.sizeIn[1] * MM_PER_INCH,
      hatchedOn: hatchDay(stock, day, Math.round(meanIn * stock.daysAnInch * chance.between(0.9, 1.2))),
      countOnHand: Math.max(count, minOrder * 6),
      minOrder,
      orderStep: minOrder >= 50 ? 25 : minOrder >= 10 ? 5 : 1,
      tiers: priceTiers(stock, { minOrder, count }, chance),
      countMethod: count > 1500 ? 'sample-weight' : 'hand',
      overcountPct: chance.pick([0, 3, 5, 5]),
      sex: stock.sex,
      ...(stock.sex === 'all-male' ? { sexClaimPct: 95 } : {}),
      feed: { onPellets: true, since: dayPlus(day, -chance.whole(10, 40)), words: stock.feed },
      water: {
        temperatureC: Math.round(chance.between(...stock.waterC) * 2) / 2,
        pH: Math.round(chance.between(6.9, 8.1) * 10) / 10,
        ghPpm: chance.whole(8, 28) * 10,
        khPpm: chance.whole(6, 20) * 10,
        saltPpt: chance.pick([0, 0, 0, 1]),
        source: chance.pick(['well', 'well', 'town', 'spring', 'pond'] as const),
        measuredOn: dayPlus(day, -chance.whole(0, 6)),
      },
      origin: chance.pick(['hatched-here', 'hatched-here', 'grown-on'] as const),
      wildCaught: false,
      health: { treatments: chance.pick(treatments), lastLosses: chance.pick(losses) },
      singleSpeciesChecked: true,
      licenceNumbers: licenceText(farm),
      statesServed: chance.happens(0.7)
        ? [own, ...(['OH', 'KY', 'IN'] as const).filter((state) => state !== own)]
        : [own],
      placeKind: 'farm-gate',
      accept: chance.happens(0.6) ? 'instant' : 'ask',
      balanceDue: chance.happens(0.8) ? 'at-handover' : 'before',
      depositPct: chance.pick([20, 25, 25, 25, 30, 50]),
      freeCancelHours: 72,
      promise: {
        windowHours: chance.pick([12, 24, 24, 24]),
        survivalDays: chance.pick([0, 0, 0, 3, 7] as const),
        remedy: chance.happens(0.8) ? 'refund' : 'replace',
        evidence: chance.pick(evidences),
      },
      ...shippingOf(wish, minOrder),
      words: [chance.pick(openings), chance.pick(advice), chance.pick(extras)].filter(Boolean).join(' '),
    },
  }
}
