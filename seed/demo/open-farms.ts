import { eq } from 'drizzle-orm'

import { db } from '@/db/client'
import { seller } from '@/db/schema/sellers'
import { farms, type FarmFacts } from '@/seed/demo/farms.facts'
import { pressButton } from '@/seed/demo/press-button'
import { need, type Actor, type Farm } from '@/seed/demo/stage'
import { seededPublicId } from '@/seed/seeded-id'
import { requirePlace } from '@/server/places/find-place'
import { openFarm } from '@/server/sellers/open-farm'
import { refreshPayouts } from '@/server/sellers/refresh-payouts'
import { findSellerOf } from '@/server/sellers/seller-store'
import { startPayouts } from '@/server/sellers/start-payouts'
import type { LicenceAnswer } from '@/shared/contracts/sellers'

function licenceOf({ state, licence, zip }: FarmFacts): LicenceAnswer {
  return licence === 'have'
    ? { state, answer: 'have', number: `${state}-${zip.slice(1)}` }
    : { state, answer: licence }
}

/** Through the processor's own pages, as a seller goes: to the end, or leaving it for later. */
async function goThroughOnboarding(owner: Actor, { key, payouts }: FarmFacts): Promise<void> {
  const { url } = await startPayouts(owner.caller, `demo:${key}`)
  await pressButton(url, { choice: payouts === 'ready' ? 'finish' : 'later' })
  const row = need(await findSellerOf(owner.caller.memberId), `farm ${key}`)
  await refreshPayouts(need(row.payoutAccountId, `payouts account of ${key}`))
}

async function open({ facts, owner, zone }: Farm): Promise<void> {
  const { farmName, kind, street, city, state, zip, phone, about, key } = facts
  const farm = { farmName, kind, street, city, state, zip, phone, about, licences: [licenceOf(facts)] }
  const opened = await openFarm(owner.caller, farm)
  if (opened.zone !== zone) throw new Error(`${key} was planned in ${zone} and lies in ${opened.zone}`)
  // The address of a farm stays good from one build of the demo to the next.
  await db()
    .update(seller)
    .set({ publicId: seededPublicId(`demo farm ${key}`) })
    .where(eq(seller.memberId, owner.caller.memberId))
  if (facts.payouts !== 'not-started') await goThroughOnboarding(owner, facts)
}

/** The farms as they will be opened, for planning. */
export async function planFarms(people: ReadonlyMap<string, Actor>): Promise<Map<string, Farm>> {
  const planned = new Map<string, Farm>()
  for (const facts of farms) {
    const { zone } = await requirePlace(facts.zip, '#/zip')
    planned.set(facts.key, { facts, owner: need(people.get(facts.key), `owner of ${facts.key}`), zone })
  }
  return planned
}

/** Opens all farms, each with a real account at the processor. */
export async function openFarms(planned: Iterable<Farm>): Promise<void> {
  for (const farm of planned) await open(farm)
}
