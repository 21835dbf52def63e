import { and, count, eq, gt, inArray, isNull, lte, ne, or } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { user } from '@/db/schema/auth'
import { listing, listingVersion } from '@/db/schema/listings'
import { memberProfile } from '@/db/schema/members'
import { order } from '@/db/schema/orders'
import { seller } from '@/db/schema/sellers'

export interface ProfileRow {
  placeLabel: string | null
  placeCell: string | null
  placeState: string | null
  units: string
  theme: string
  reminderMail: boolean
  quietFrom: string | null
  quietUntil: string | null
  quietZone: string | null
}

export interface MemberRow {
  name: string
  email: string
  emailVerified: boolean
  profile: ProfileRow | null
  seller: { id: number; publicId: string } | null
}

export async function findMember(memberId: string, tx: Tx = db()): Promise<MemberRow | null> {
  const [found] = await tx
    .select({
      name: user.name,
      email: user.email,
      emailVerified: user.emailVerified,
      profile: memberProfile,
      sellerId: seller.id,
      sellerPublicId: seller.publicId,
    })
    .from(user)
    .leftJoin(memberProfile, eq(memberProfile.memberId, user.id))
    .leftJoin(seller, eq(seller.memberId, user.id))
    .where(eq(user.id, memberId))
  if (!found) return null
  const { name, email, emailVerified, profile, sellerId, sellerPublicId } = found
  const ownSeller =
    sellerId !== null && sellerPublicId !== null ? { id: sellerId, publicId: sellerPublicId } : null
  return { name, email, emailVerified, profile, seller: ownSeller }
}

export async function isMember(memberId: string, tx: Tx): Promise<boolean> {
  return (await tx.$count(user, eq(user.id, memberId))) === 1
}

export async function renameMember(memberId: string, name: string, tx: Tx): Promise<void> {
  await tx.update(user).set({ name, updatedAt: new Date() }).where(eq(user.id, memberId))
}

export async function saveProfile(
  memberId: string,
  change: Partial<ProfileRow> & { updatedAt: Date },
  tx: Tx,
): Promise<void> {
  await tx
    .insert(memberProfile)
    .values({ memberId, ...change })
    .onDuplicateKeyUpdate({ set: change })
}

const DAY_MS = 86_400_000
const unpaid = isNull(order.balancePaidAt)

/** Orders in which the next move is this member's: as buyer to pay or to look, as seller to answer or to hand over. */
export async function countOrdersWaiting(
  who: { memberId: string; sellerId: number | null },
  at: Date,
): Promise<number> {
  const buyersMove = and(
    eq(order.buyerId, who.memberId),
    or(
      inArray(order.state, ['reserved', 'handed_over', 'arrived']),
      and(eq(order.state, 'ready'), unpaid, gt(order.balanceCents, 0)),
      and(eq(order.state, 'scheduled'), eq(order.balanceDue, 'before'), unpaid, gt(order.balanceCents, 0)),
    ),
  )
  const sellersMove =
    who.sellerId === null
      ? undefined
      : and(
          eq(order.sellerId, who.sellerId),
          or(
            inArray(order.state, ['requested', 'claim_open']),
            // A day ahead the animals are caught and fasted; on the day they are handed over.
            and(
              inArray(order.state, ['scheduled', 'ready']),
              lte(order.slotStartsAt, new Date(at.getTime() + DAY_MS)),
            ),
          ),
        )
  return db().$count(order, or(buyersMove, sellersMove))
}

/** Listing versions waiting for a moderator, without the moderator's own. */
export async function countReviewsWaiting(sellerId: number | null): Promise<number> {
  const [counted] = await db()
    .select({ count: count() })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .where(
      and(
        eq(listingVersion.review, 'waiting'),
        sellerId === null ? undefined : ne(listing.sellerId, sellerId),
      ),
    )
  return counted?.count ?? 0
}
