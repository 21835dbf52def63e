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

interface MemberWish {
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

/** A member who can sign in with this password. The same e-mail always gets the same id. */
export async function buildMember(db: Tx, wish: MemberWish): Promise<BuiltMember> {
  const at = wish.at ?? BUILT_AT
  const memberId = seededUuid(`member ${wish.email}`)
  const name = wish.name ?? wish.email.split('@')[0] ?? 'Member'
  await db.insert(user).values({
    id: memberId,
    name,
    email: wish.email,
    emailVerified: wish.emailVerified ?? true,
    role: wish.role ?? 'member',
    createdAt: at,
    updatedAt: at,
  })
  await db.insert(account).values({
    id: seededUuid(`account ${wish.email}`),
    accountId: memberId,
    providerId: 'credential',
    userId: memberId,
    password: await hashOnce(wish.password ?? BUILT_PASSWORD),
    createdAt: at,
    updatedAt: at,
  })
  if (wish.place) {
    const { label, cell, state } = wish.place
    await db
      .insert(memberProfile)
      .values({ memberId, placeLabel: label, placeCell: cell, placeState: state, updatedAt: at })
  }
  return { memberId, name, email: wish.email }
}
