import { randomUUID } from 'node:crypto'

import type { Database } from '@/db/client'
import { inTransaction } from '@/db/transaction'
import type { TestFake } from '@/payments/fake/fake-for-tests'
import { openSellerAccount } from '@/payments/open-seller-account'
import { buildBatch, type BuiltBatch } from '@/seed/build-batch'
import { buildMember } from '@/seed/build-member'
import { buildSeller, type BuiltSeller } from '@/seed/build-seller'
import { loadPlaces } from '@/seed/load-places'
import { loadRules } from '@/seed/load-rules'
import { now } from '@/server/clock'
import { readListing } from '@/server/listings/read-listing'
import { projectListings } from '@/server/search/project-listings'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { ListingBody } from '@/shared/contracts/listings'

/** A live batch and the statements its buyers in Ohio have to tick. */
export interface DeskBatch extends BuiltBatch {
  ticks: string[]
}

export interface BatchWish {
  free?: number
  body?: Partial<FishBody>
  whole?: ListingBody
}

export const HATCHERY_EMAIL = 'hatchery@example.org'

/** Every hold of a batch as a body that the contract takes. */
export function reserveBody(batch: DeskBatch, change: Record<string, unknown> = {}) {
  return {
    quantity: 25,
    windowId: batch.windows[0]?.publicId,
    near: '45202',
    version: 1,
    ticked: batch.ticks,
    ...change,
  }
}

/** Places and demonstration rules of the Ohio valley. */
export async function layGround(db: Database): Promise<void> {
  await loadPlaces(db, { states: ['OH', 'KY', 'IN', 'IL'] })
  await loadRules(db, { demonstration: true, at: new Date() })
}

/** A hatchery whose account at the practice processor may be paid. */
export async function openHatchery(db: Database, fake: TestFake): Promise<BuiltSeller> {
  const member = await buildMember(db, { email: HATCHERY_EMAIL, name: 'Ada Marsh' })
  const { accountId } = await openSellerAccount({
    sellerId: 'desk',
    email: HATCHERY_EMAIL,
    displayName: 'Marsh Hatchery',
    idempotencyKey: `desk-${randomUUID()}`,
  })
  await fake.control(`onboarding/${accountId}`)
  return buildSeller(db, { member, payoutAccountId: accountId })
}

/** A live batch, found by search, and what its buyer has to tick. */
export async function openBatch(
  db: Database,
  { seller, name, ...wish }: BatchWish & { seller: BuiltSeller; name: string },
): Promise<DeskBatch> {
  const built = await buildBatch(db, { seller, name, at: now(), ...wish })
  await inTransaction((tx) => projectListings(tx, [built.id]))
  const { gate } = await readListing(null, built.publicId, '45202')
  return { ...built, ticks: gate?.ticks.map((tick) => tick.id) ?? [] }
}

/** One pickup window a week ahead with that many places. */
export function roomyWindow(capacity: number): Pick<ListingBody, 'windows'> {
  const day = new Date(now().getTime() + 7 * 86_400_000).toISOString().slice(0, 10)
  return { windows: [{ day, from: '09:00', until: '17:00', capacity }] }
}
