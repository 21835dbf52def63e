import { eq, sql } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { user } from '@/db/schema/auth'
import { zipPlace } from '@/db/schema/places'
import { seller } from '@/db/schema/sellers'
import { seededPublicId } from '@/seed/seeded-id'
import type { BuiltMember } from '@/seed/build-member'
import type { LicenceAnswer } from '@/shared/contracts/sellers'
import { cellAt, cellCentre, widenCell, type CellSize } from '@/shared/domain/geo/location-cell'
import { printCellId } from '@/shared/domain/geo/location-cell-id'

export type BuiltSeller = typeof seller.$inferSelect

interface SellerWish {
  member: BuiltMember
  farmName?: string
  about?: string
  kind?: 'hatchery' | 'grower'
  /** The place comes from the ZIP, which must be loaded. */
  zip?: string
  street?: string
  phone?: string
  zone?: string
  /** 50 in town; thin country is coarser. */
  cellSize?: CellSize
  licences?: LicenceAnswer[]
  payouts?: 'ready' | 'unfinished' | 'not-started'
  payoutAccountId?: string
  rating?: { count: number; sum: number }
  at?: Date
}

const BUILT_AT = new Date('2026-03-02T12:00:00Z')
const CINCINNATI = '45202'

function payoutColumns(wish: SellerWish) {
  const payouts = wish.payouts ?? 'ready'
  if (payouts === 'not-started')
    return { payoutAccountId: null, chargesEnabled: false, payoutsEnabled: false }
  const payoutAccountId =
    wish.payoutAccountId ?? `acct_${seededPublicId(`payouts ${wish.member.email}`).slice(0, 16)}`
  return { payoutAccountId, chargesEnabled: payouts === 'ready', payoutsEnabled: payouts === 'ready' }
}

/** Makes a member a seller who, unless said otherwise, can be paid and holds a licence number at home. */
export async function buildSeller(db: Tx, wish: SellerWish): Promise<BuiltSeller> {
  const { member } = wish
  const at = wish.at ?? BUILT_AT
  const [zip] = await db
    .select()
    .from(zipPlace)
    .where(eq(zipPlace.zip, wish.zip ?? CINCINNATI))
  const fine = zip && cellAt(zip, 50)
  if (!zip || !fine) throw new Error(`no place for ZIP ${wish.zip ?? CINCINNATI}: load the places first`)
  const cell = widenCell(fine, wish.cellSize ?? 50)
  const centre = cellCentre(cell)
  const [made] = await db
    .insert(seller)
    .values({
      publicId: seededPublicId(`seller ${member.email}`),
      memberId: member.memberId,
      farmName: wish.farmName ?? `${member.name}'s hatchery`,
      about: wish.about ?? '',
      kind: wish.kind ?? 'hatchery',
      street: wish.street ?? '12 Mill Lane',
      city: zip.city,
      state: zip.state,
      zip: zip.zip,
      phone: wish.phone ?? '(513) 555-0142',
      trueLat: zip.lat,
      trueLng: zip.lng,
      cellId: printCellId(cell),
      cellLat: centre.lat,
      cellLng: centre.lng,
      zone: wish.zone ?? 'America/New_York',
      licences: wish.licences ?? [{ state: zip.state, answer: 'have', number: `${zip.state}-A 1142` }],
      ...payoutColumns(wish),
      ratingCount: wish.rating?.count ?? 0,
      // Three equal marks a rating.
      ratingSum: 3 * (wish.rating?.sum ?? 0),
      fishMarkSum: wish.rating?.sum ?? 0,
      countMarkSum: wish.rating?.sum ?? 0,
      contactMarkSum: wish.rating?.sum ?? 0,
      createdAt: at,
      updatedAt: at,
    })
    .$returningId()
  await db
    .update(user)
    .set({ role: sql`concat(${user.role}, ',seller')` })
    .where(eq(user.id, member.memberId))
  const [built] = await db
    .select()
    .from(seller)
    .where(eq(seller.id, made?.id ?? 0))
  if (!built) throw new Error('the seller was not built')
  return built
}
