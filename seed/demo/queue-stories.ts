import type { BatchPlan } from '@/seed/demo/batch-plan'
import type { ListingDesk } from '@/seed/demo/listing-desk'
import { dayPlus } from '@/seed/demo/pickup-times'
import { planBatch, type BatchWish } from '@/seed/demo/plan-batch'
import { need, type Stage } from '@/seed/demo/stage'
import { after, HOUR_MS, type Step } from '@/seed/demo/timeline'
import { dayOf } from '@/server/listings/day-of'
import type { ListingBody } from '@/shared/contracts/listings'

/** A listing that gives the moderators work, with all that happened to it. */
export interface QueueStory {
  plan: BatchPlan
  steps: (desk: ListingDesk) => Step[]
}

type Wish = Omit<BatchWish, 'farm' | 'daysAgo'> & { farm: string; daysAgo?: number }
type Change = Partial<ListingBody>

interface Telling {
  stage: Stage
  told: QueueStory[]
}

function plan({ stage }: Telling, wish: Wish): BatchPlan {
  const farm = need(stage.farms.get(wish.farm), wish.farm)
  return planBatch(stage, { daysAgo: 0.6, ...wish, farm })
}

/** Submitted in the last day or two, and nobody has looked yet. */
function waits(telling: Telling, wish: Wish, change: Change = {}): BatchPlan {
  const made = plan(telling, wish)
  const steps = (desk: ListingDesk): Step[] => [
    { at: made.submittedAt, story: made.key, what: 'submitted', run: () => desk.submit(made, change) },
  ]
  telling.told.push({ plan: made, steps })
  return made
}

/** Approved some time ago, changed by its seller some hours ago. */
function changed(telling: Telling, wish: Wish, change: Change): void {
  const made = plan(telling, { daysAgo: 15, ...wish })
  const at = after(telling.stage.at, -5 * HOUR_MS)
  telling.told.push({
    plan: made,
    steps: (desk) => [
      ...desk.publish(made),
      { at, story: made.key, what: 'changed', run: () => desk.submit(made, change) },
    ],
  })
}

function decided(telling: Telling, wish: Wish, given: Parameters<ListingDesk['decide']>[1]): void {
  const made = plan(telling, wish)
  telling.told.push({
    plan: made,
    steps: (desk) => [
      { at: made.submittedAt, story: made.key, what: 'submitted', run: () => desk.submit(made) },
      { at: made.decidedAt, story: made.key, what: 'answered', run: () => desk.decide(made.key, given) },
    ],
  })
}

/** Begun and not finished: some fields typed, some not yet. */
function drafted(telling: Telling, wish: Wish): void {
  const made = plan(telling, wish)
  const { category, taxonId, stage, sizeLoMm, sizeHiMm, hatchedOn, feed } = made.body
  const typed = { category, taxonId, stage, sizeLoMm, sizeHiMm, hatchedOn, feed, words: '' }
  made.shots = []
  telling.told.push({
    plan: made,
    steps: (desk) => [
      { at: made.submittedAt, story: made.key, what: 'begun', run: () => desk.begin(made, typed) },
    ],
  })
}

/** What waits in the moderators' queue, and what they have answered: every kind of doubt once. */
export function planQueueStories(stage: Stage): QueueStory[] {
  const telling: Telling = { stage, told: [] }
  waits(
    telling,
    { key: 'look-alike name', farm: 'tenpenny', taxonId: 'yellow_perch' },
    {
      words: 'Eat like European perch and taste as good. Trained on pellets, three grades.',
    },
  )
  waits(
    telling,
    { key: 'way around', farm: 'beargrass', taxonId: 'nile_tilapia' },
    {
      words: 'Fry every three weeks. Quicker without the site: text me at 502-555-0114, cash only.',
    },
  )
  waits(
    telling,
    { key: 'slipped in', farm: 'floydsfork', taxonId: 'bluegill' },
    {
      words: 'A few green sunfish may have slipped in at grading; we take them back.',
    },
  )
  waits(telling, {
    key: 'no ruler',
    farm: 'sycamore',
    taxonId: 'yellow_perch',
    picture: 'yellow-perch-no-ruler',
  })
  waits(telling, { key: 'law unknown', farm: 'stillmeadow', taxonId: 'redclaw_crayfish' })
  const borrowed = waits(telling, {
    key: 'borrowed photo',
    farm: 'quarryside',
    taxonId: 'goldfish',
    picture: 'goldfish-pan',
  })
  const lender = plan(telling, {
    key: 'lent photo',
    farm: 'whitewater',
    taxonId: 'goldfish',
    picture: 'goldfish-pan',
    daysAgo: 12,
  })
  lender.shots = lender.shots.slice(0, 1)
  borrowed.shots = borrowed.shots
    .slice(0, 1)
    .map((shot) => ({ ...shot, framing: lender.shots[0]?.framing ?? '' }))
  telling.told.push({ plan: lender, steps: (desk) => desk.publish(lender) })
  const old = waits(telling, { key: 'old photo', farm: 'southgate', taxonId: 'nile_tilapia' })
  const cameraDay = dayPlus(dayOf(stage.at, old.farm.zone), -150)
  old.shots = old.shots.map((shot) => ({ ...shot, cameraDay }))
  changed(
    telling,
    { key: 'another animal', farm: 'lantern', taxonId: 'hybrid_bluegill' },
    { taxonId: 'bluegill' },
  )
  changed(
    telling,
    { key: 'new words', farm: 'grantridge', taxonId: 'channel_catfish' },
    {
      words: 'New this week: graded again, the small ones went back into the pond. Bring a cooler.',
    },
  )
  decided(
    telling,
    { key: 'rejected', farm: 'gearworks', taxonId: 'blue_tilapia', daysAgo: 9 },
    {
      decision: 'reject',
      reason: 'photo-not-this-batch',
      note: 'The fish in the photo are twice the size you give. Please begin anew with a photo of this batch.',
    },
  )
  decided(
    telling,
    { key: 'asked', farm: 'jessamine', taxonId: 'common_carp_koi', daysAgo: 3 },
    {
      decision: 'ask',
      reason: 'price-unclear',
      note: 'Is the price for one fish or for five? Say so in the words, then submit again.',
    },
  )
  drafted(telling, { key: 'hatchery draft', farm: 'hatchery', taxonId: 'largemouth_bass' })
  drafted(telling, { key: 'first draft', farm: 'shelbyglen', taxonId: 'nile_tilapia' })
  drafted(telling, { key: 'summer draft', farm: 'hilltop', taxonId: 'goldfish' })
  return telling.told
}
