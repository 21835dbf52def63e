import { hashPassword } from 'better-auth/crypto'

import type { Tx } from '@/db/client'
import { account, user } from '@/db/schema/auth'
import { memberProfile } from '@/db/schema/members'
import { seededUuid } from '@/seed/seeded-id'

export interface BuiltMember {
  memberId: string
  name: string
  email: string
}

export interface MemberWish {
  email: string
  name?: string
  password?: string
  /** Comma list; `seller` is added by buildSeller. */
  role?: string
  emailVerified?: boolean
  place?: { label: string; cell: string; state: string }
  at?: Date
}

export const BUILT_PASSWORD = 'gravel otter bucket 7'
const BUILT_AT = new Date('2026-03-01T12:00:00Z')

// One hash costs about 115 ms: the same password is hashed once.
const hashes = new Map<string, Promise<string>>()

function hashOnce(password: string): Promise<string> {
  const known = hashes.get(password) ?? hashPassword(password)
  hashes.set(password, known)
  return known
}

/** Members who can sign in with their passwords, in three statements however many. The same e-mail always gets the same id. */
export async function buildMembers(db: Tx, wishes: readonly MemberWish[]): Promise<BuiltMember[]> {
  if (wishes.length === 0) return []
  const made = wishes.map((wish) => ({
    ...{ wish, at: wish.at ?? BUILT_AT, memberId: seededUuid(`member ${wish.email}`) },
    name: wish.name ?? wish.email.split('@')[0] ?? 'Member',
  }))
  await db.insert(user).values(
    made.map(({ wish, at, memberId, name }) => ({
      ...{ id: memberId, name, email: wish.email, createdAt: at, updatedAt: at },
      emailVerified: wish.emailVerified ?? true,
      role: wish.role ?? 'member',
    })),
  )
  const accounts = made.map(async ({ wish, at, memberId }) => ({
    ...{ id: seededUuid(`account ${wish.email}`), accountId: memberId, userId: memberId },
    ...{ providerId: 'credential', createdAt: at, updatedAt: at },
    password: await hashOnce(wish.password ?? BUILT_PASSWORD),
  }))
  await db.insert(account).values(await Promise.all(accounts))
  const profiles = made.flatMap(({ wish: { place }, at, memberId }) =>
    place
      ? [{ memberId, placeLabel: place.label, placeCell: place.cell, placeState: place.state, updatedAt: at }]
      : [],
  )
  if (profiles.length > 0) await db.insert(memberProfile).values(profiles)
  return made.map(({ wish, memberId, name }) => ({ memberId, name, email: wish.email }))
}

/** One of them. */
export async function buildMember(db: Tx, wish: MemberWish): Promise<BuiltMember> {
  const [made] = await buildMembers(db, [wish])
  if (!made) throw new Error('the member was not built')
  return made
}
