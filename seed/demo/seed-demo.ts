import { inTransaction } from '@/db/transaction'
import { lastEffect, passOverOldMail, settleEvents } from '@/seed/demo/effects'
import { forgetDemoCalls, markDemo } from '@/seed/demo/demo-mark'
import { openListingDesk, type ListingDesk } from '@/seed/demo/listing-desk'
import { makePeople } from '@/seed/demo/make-people'
import { openFarms } from '@/seed/demo/open-farms'
import { openOrderDesk } from '@/seed/demo/order-desk'
import { orderSteps } from '@/seed/demo/order-steps'
import { openPhotoDesk } from '@/seed/demo/photo-desk'
import { planBatches } from '@/seed/demo/plan-batches'
import { planOrders } from '@/seed/demo/plan-orders'
import { planQueueStories } from '@/seed/demo/queue-stories'
import { need, type Stage } from '@/seed/demo/stage'
import { after, DAY_MS, playTimeline, turnClockTo, type Step } from '@/seed/demo/timeline'
import type { BatchPlan } from '@/seed/demo/batch-plan'
import { setClockOffset } from '@/server/clock'
import { changeSelling } from '@/server/listings/change-selling'
import { listListingIdsOf } from '@/server/listings/listing-store'
import { registerDoers } from '@/server/outbox/doers'
import { projectListings } from '@/server/search/project-listings'
import { findSellerOf } from '@/server/sellers/seller-store'

export interface DemoOptions {
  /** Domain time runs this far ahead of real time. */
  clockOffsetMs: number
  isSmall: boolean
  say: (line: string) => void
}

const PAUSED_EVERY = 29

function pauseSteps(stage: Stage, batches: readonly BatchPlan[], desk: ListingDesk): Step[] {
  return batches
    .filter((plan, at) => at % PAUSED_EVERY === 13 && plan.decidedAt < after(stage.at, -4 * DAY_MS))
    .map((plan) => ({
      at: after(stage.at, -3 * DAY_MS),
      what: `${plan.key} is paused`,
      run: async () => void (await changeSelling(plan.farm.owner.caller, desk.idOf(plan.key), 'paused')),
    }))
}

/** Search knows of each listing what was true when it last changed: brought up to the demo's moment. */
async function projectAll(stage: Stage): Promise<void> {
  for (const { owner } of stage.farms.values()) {
    const farm = need(await findSellerOf(owner.caller.memberId), owner.caller.name)
    await inTransaction(async (tx) => projectListings(tx, await listListingIdsOf(farm.id, tx)))
  }
}

async function setStage({ isSmall, say }: DemoOptions, at: Date): Promise<Stage> {
  turnClockTo(after(at, -80 * DAY_MS))
  const people = await makePeople(after(at, -80 * DAY_MS))
  say(`people: ${people.size}`)
  turnClockTo(after(at, -75 * DAY_MS))
  const farms = await openFarms(people)
  const ready = [...farms.values()].filter((farm) => farm.facts.payouts === 'ready').length
  say(`farms: ${farms.size}, ${ready} can be paid`)
  const growers = [...people].filter(([key]) => key.startsWith('grower ')).map(([, actor]) => actor)
  return { at, isSmall, people, growers, farms, say }
}

/** Plays the whole demo through the product's own commands and its practice processor, up to the given moment. */
export async function seedDemo(options: DemoOptions): Promise<void> {
  const { say } = options
  const at = new Date(Date.now() + options.clockOffsetMs)
  registerDoers()
  const stage = await setStage(options, at)
  const batches = planBatches(stage)
  const stories = planQueueStories(stage)
  const orders = planOrders(stage, batches)
  const plans = [...batches, ...stories.map((story) => story.plan)]
  const photos = await openPhotoDesk(
    plans.toSorted((one, other) => one.submittedAt.getTime() - other.submittedAt.getTime()),
  )
  const listings = openListingDesk(stage, photos)
  const moderator = need(stage.people.get('moderator'), 'moderator')
  let lastOldEffect = 0
  const lastDay: Step = {
    at: after(at, -DAY_MS),
    what: 'the last day begins',
    run: async () => void (lastOldEffect = await lastEffect()),
  }
  try {
    const leftOut = await playTimeline([
      lastDay,
      ...batches.flatMap((plan) => listings.publish(plan)),
      ...stories.flatMap((story) => story.steps(listings)),
      ...pauseSteps(stage, batches, listings),
      ...orders.flatMap((plan) => orderSteps(plan, openOrderDesk(plan, listings, moderator), at)),
    ])
    for (const step of leftOut) say(`left out: ${step}`)
  } finally {
    await photos.close()
  }
  say(`listings: ${plans.length} with ${photos.count()} photos; orders: ${orders.length}`)
  setClockOffset(options.clockOffsetMs)
  await settleEvents()
  await projectAll(stage)
  await forgetDemoCalls()
  const mails = await passOverOldMail(lastOldEffect)
  say(`mails: ${mails.kept} of the last day wait to be sent, ${mails.passedOver} older ones are marked done`)
  const admin = need(stage.people.get('admin'), 'admin')
  await markDemo(admin.caller.memberId, { listings: plans.length, orders: orders.length }, at)
}
