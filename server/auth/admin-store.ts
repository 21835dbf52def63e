import { randomUUID } from 'node:crypto'

import { like } from 'drizzle-orm'

import { db } from '@/db/client'
import { account, user } from '@/db/schema/auth'
import { inTransaction } from '@/db/transaction'

export async function countAdmins(): Promise<number> {
  return db().$count(user, like(user.role, '%admin%'))
}

/** A member with the admin role and a confirmed address. Fails on an address that is taken. */
export async function insertAdmin(admin: {
  name: string
  email: string
  passwordHash: string
}): Promise<void> {
  const at = new Date()
  const id = randomUUID()
  await inTransaction(async (tx) => {
    await tx.insert(user).values({
      id,
      name: admin.name,
      email: admin.email,
      emailVerified: true,
      role: 'member,moderator,admin',
      createdAt: at,
      updatedAt: at,
    })
    await tx.insert(account).values({
      id: randomUUID(),
      accountId: id,
      providerId: 'credential',
      userId: id,
      password: admin.passwordHash,
      createdAt: at,
      updatedAt: at,
    })
  })
}
