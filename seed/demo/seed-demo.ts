import { inTransaction } from '@/db/transaction'
import { lastEffect, passOverOldMail, passOverOldNotices, settleEvents } from '@/seed/demo/effects'
import { forgetDemoCalls, markDemo } from '@/seed/demo/demo-mark'
import { openListingDesk, type ListingDesk } from '@/seed/demo/listing-desk'
import { makePeople } from '@/seed/demo/make-people'
import { openFarms, planFarms } from '@/seed/demo/open-farms'
import { openOrderDesk } from '@/seed/demo/order-desk'
import { orderSteps } from '@/seed/demo/order-steps'
import { openPhotoDesk } from '@/seed/demo/photo-desk'
import { planBatches } from '@/seed/demo/plan-batches'
import { planLotOrders, planLots } from '@/seed/demo/plan-lots'
import { planShipped } from '@/seed/demo/plan-shipped'
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
  say: (line: string) => void
}

const PAUSED = 3

/** A few that nobody has ordered from take a break. */
function pauseSteps({ at }: Stage, idle: readonly BatchPlan[], desk: ListingDesk): Step[] {
  return idle
    .filter((plan) => plan.decidedAt < after(at, -4 * DAY_MS))
    .slice(0, PAUSED)
    .map((plan) => ({
      at: after(at, -3 * DAY_MS),
      story: plan.key,
      what: 'paused',
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

async function setStage({ say }: DemoOptions, at: Date): Promise<Stage> {
  turnClockTo(after(at, -80 * DAY_MS))
  const people = await makePeople(after(at, -80 * DAY_MS))
  say(`people: ${people.size}`)
  const growers = [...people].filter(([key]) => key.startsWith('grower ')).map(([, actor]) => actor)
  return { at, people, growers, farms: await planFarms(people) }
}

/** Plays the whole demo through the product's own commands and its practice processor, up to the given moment. */
export async function seedDemo(options: DemoOptions): Promise<void> {
  const { say } = options
  const at = new Date(Date.now() + options.clockOffsetMs)
  registerDoers()
  const stage = await setStage(options, at)
  const batches = planBatches(stage)
  const stories = planQueueStories(stage)
  const lots = planLots(stage)
  const orders = [
    ...planOrders(stage, batches),
    ...planShipped(stage, batches),
    ...planLotOrders(stage, lots),
  ]
  const isIdle = (plan: BatchPlan) => !orders.some((order) => order.batch === plan)
  const plans = [...batches, ...lots, ...stories.map((story) => story.plan)]
  const photos = await openPhotoDesk(
    plans.toSorted((one, other) => one.submittedAt.getTime() - other.submittedAt.getTime()),
  )
  turnClockTo(after(at, -75 * DAY_MS))
  await openFarms(stage.farms.values())
  say(`farms: ${stage.farms.size}`)
  const listings = openListingDesk(stage, photos)
  const moderator = need(stage.people.get('moderator'), 'moderator')
  let lastOldEffect = 0
  const lastDay: Step = {
    at: after(at, -DAY_MS),
    story: 'the last day',
    what: 'begins',
    run: async () => void (lastOldEffect = await lastEffect()),
  }
  try {
    const brokenOff = await playTimeline([
      lastDay,
      ...[...batches, ...lots].flatMap((plan) => listings.publish(plan)),
      ...stories.flatMap((story) => story.steps(listings)),
      ...pauseSteps(stage, batches.filter(isIdle), listings),
      ...orders.flatMap((plan) => orderSteps(plan, openOrderDesk(plan, listings, moderator), at)),
    ])
    for (const story of brokenOff) say(`broke off: ${story}`)
  } finally {
    await photos.close()
  }
  say(`listings: ${plans.length} with ${photos.count()} photos; orders: ${orders.length}`)
  setClockOffset(options.clockOffsetMs)
  await settleEvents()
  await projectAll(stage)
  await forgetDemoCalls()
  await passOverOldNotices(after(at, -DAY_MS))
  const mails = await passOverOldMail(lastOldEffect)
  say(`mails: ${mails.kept} of the last day wait to be sent, ${mails.passedOver} older ones are marked done`)
  const admin = need(stage.people.get('admin'), 'admin')
  await markDemo(admin.caller.memberId, { listings: plans.length, orders: orders.length }, at)
}
