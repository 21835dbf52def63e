import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { Packs } from '@/shared/domain/transport/pack-heat'
import type { BagSize, BoxSize } from '@/shared/domain/transport/packing.facts'
import { coldPacks, heatPacks, type HeatPackId } from '@/shared/domain/transport/packs.facts'
import type { Trip, TripAnswer } from '@/shared/domain/transport/trip'
import { rankOf, type Reason } from '@/shared/domain/transport/verdict'

/** As many boxes as one household carries to the counter: house rule. */
const BOXES_MOST = 12
const PACKS_MOST = 4
const BAGS_PER_BOX_MOST = 4
/** As in the trip: bags fill at most this share of a box. */
const FILL_MOST = 0.95

export interface PackingTask extends Omit<Trip, 'container'> {
  standsStill: boolean
  boxSizes: readonly BoxSize[]
  bagSizes: readonly BagSize[]
}

interface Pattern {
  box: BoxSize
  bag: BagSize
  bagsPerBox: number
  packs: Packs
  /** One box with everything in it. */
  centsPerBox: number
}

export interface PackingPlan extends Pattern {
  boxes: number
  /** In the fullest bag. */
  animalsPerBag: number
  priceCents: number
  answer: TripAnswer
}

/** `because`: what still speaks against the packing that came nearest, when none is safe. */
export type PackingAnswer = { plan: PackingPlan } | { plan: null; because: readonly Reason[] }

/** The cheapest packing that is safe on the cold and on the hot day, or why there is none. */
export function planPacking(task: PackingTask): PackingAnswer {
  let best: PackingPlan | null = null
  let nearest: TripAnswer | null = null
  for (const pattern of patternsOf(task)) {
    const most = best
      ? Math.min(BOXES_MOST, Math.ceil(best.priceCents / pattern.centsPerBox) - 1)
      : BOXES_MOST
    if (most < 1) break
    const { plan, answer } = fewestBoxes(task, pattern, most)
    if (plan) best = plan
    else if (!nearest || isNearer(answer, nearest)) nearest = answer
  }
  if (best) return { plan: best }
  return { plan: null, because: nearest?.reasons.filter(({ verdict }) => verdict !== 'safe') ?? [] }
}

const isNearer = (a: TripAnswer, b: TripAnswer) =>
  rankOf(a.verdict) < rankOf(b.verdict) || (a.verdict === b.verdict && a.reasons.length < b.reasons.length)

/** Every way to fill one box, cheapest first. */
function patternsOf({ boxSizes, bagSizes }: PackingTask): Pattern[] {
  return boxSizes
    .flatMap((box) =>
      bagSizes.flatMap((bag) =>
        bagCounts(box, bag).flatMap((bagsPerBox) =>
          packChoices.map(({ packs, cents }) => ({
            box,
            bag,
            bagsPerBox,
            packs,
            centsPerBox: box.priceCents + bagsPerBox * bag.priceCents + cents,
          })),
        ),
      ),
    )
    .sort((a, b) => a.centsPerBox - b.centsPerBox)
}

function bagCounts({ box }: BoxSize, bag: BagSize): number[] {
  const insideL = (box.lengthCm * box.widthCm * box.heightCm) / 1000
  const fit = Math.min(BAGS_PER_BOX_MOST, Math.floor((insideL * FILL_MOST) / (bag.waterL + bag.oxygenL)))
  return Array.from({ length: fit }, (_, at) => at + 1)
}

const counts = Array.from({ length: PACKS_MOST }, (_, at) => at + 1)
const heatIds: readonly HeatPackId[] = ['heat-40h', 'heat-72h']

const packChoices: readonly { packs: Packs; cents: number }[] = [
  { packs: { heat: null, cold: null, hasAirHoles: false }, cents: 0 },
  ...heatIds.flatMap((id) =>
    counts.map((count) => ({
      packs: { heat: { id, count }, cold: null, hasAirHoles: true },
      cents: count * heatPacks[id].priceCents,
    })),
  ),
  ...counts.map((count) => ({
    packs: { heat: null, cold: { id: 'cold-450g' as const, count }, hasAirHoles: false },
    cents: count * coldPacks['cold-450g'].priceCents,
  })),
]

/** More boxes never make a trip worse, so the fewest safe number is found by halving. */
function fewestBoxes(
  task: PackingTask,
  pattern: Pattern,
  most: number,
): { plan: PackingPlan | null; answer: TripAnswer } {
  const { bag, box, bagsPerBox, packs } = pattern
  const answerOf = (boxes: number) =>
    checkTrip({
      ...task,
      container: {
        kind: 'bags',
        boxes,
        bagsPerBox,
        waterLPerBag: bag.waterL,
        oxygenLPerBag: bag.oxygenL,
        isDoubled: true,
        standsStill: task.standsStill,
        box: box.box,
        packs,
      },
    })
  let answer = answerOf(most)
  if (answer.verdict !== 'safe') return { plan: null, answer }
  let [none, boxes] = [0, most]
  while (boxes - none > 1) {
    const middle = Math.floor((none + boxes) / 2)
    const tried = answerOf(middle)
    if (tried.verdict === 'safe') [boxes, answer] = [middle, tried]
    else none = middle
  }
  const animalsPerBag = Math.ceil(task.animals.count / (boxes * bagsPerBox))
  return {
    plan: { ...pattern, boxes, animalsPerBag, priceCents: boxes * pattern.centsPerBox, answer },
    answer,
  }
}
