import { eq } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { user } from '@/db/schema/auth'
import { seller } from '@/db/schema/sellers'

export type SellerRow = typeof seller.$inferSelect
type NewSeller = typeof seller.$inferInsert

export async function findSellerOf(memberId: string, tx: Tx = db()): Promise<SellerRow | null> {
  const [found] = await tx.select().from(seller).where(eq(seller.memberId, memberId))
  return found ?? null
}

export async function findSeller(id: number, tx: Tx = db()): Promise<SellerRow | null> {
  const [found] = await tx.select().from(seller).where(eq(seller.id, id))
  return found ?? null
}

export async function findSellerByPublicId(publicId: string): Promise<SellerRow | null> {
  const [found] = await db().select().from(seller).where(eq(seller.publicId, publicId))
  return found ?? null
}

export async function findSellerByAccount(payoutAccountId: string): Promise<SellerRow | null> {
  const [found] = await db().select().from(seller).where(eq(seller.payoutAccountId, payoutAccountId))
  return found ?? null
}

export async function insertSeller(row: NewSeller, tx: Tx): Promise<void> {
  await tx.insert(seller).values(row)
}

export async function updateSeller(id: number, change: Partial<NewSeller>, tx: Tx = db()): Promise<void> {
  await tx.update(seller).set(change).where(eq(seller.id, id))
}

/** Roles are a comma list in better-auth's own table. */
export async function grantSellerRole(memberId: string, tx: Tx): Promise<void> {
  const [found] = await tx.select({ role: user.role }).from(user).where(eq(user.id, memberId)).for('update')
  const roles = (found?.role ?? 'member').split(',').map((role) => role.trim())
  if (roles.includes('seller')) return
  await tx
    .update(user)
    .set({ role: [...roles, 'seller'].join(','), updatedAt: new Date() })
    .where(eq(user.id, memberId))
}
