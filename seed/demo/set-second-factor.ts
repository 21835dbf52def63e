import { eq } from 'drizzle-orm'
import { symmetricEncrypt } from 'better-auth/crypto'

import { db } from '@/db/client'
import { twoFactor, user } from '@/db/schema/auth'
import { seededUuid } from '@/seed/seeded-id'
import { seededRandom } from '@/seed/seeded-random'
import { theAuth } from '@/server/auth/auth'

const CODES = 10
const LETTERS = 'abcdefghijklmnopqrstuvwxyz0123456789'

/** Backup codes in the plugin's own form: five and five characters. */
function backupCodes(memberId: string): string[] {
  const chance = seededRandom(`backup codes ${memberId}`)
  const five = () => Array.from({ length: 5 }, () => chance.pick([...LETTERS])).join('')
  return Array.from({ length: CODES }, () => `${five()}-${five()}`)
}

/** Sets up an authenticator the way better-auth's twoFactor plugin keeps it: both texts sealed with the auth secret. */
export async function setSecondFactor(memberId: string, secret: string): Promise<void> {
  const { secretConfig: key } = await theAuth().$context
  await db()
    .insert(twoFactor)
    .values({
      id: seededUuid(`second factor ${memberId}`),
      userId: memberId,
      secret: await symmetricEncrypt({ key, data: secret }),
      backupCodes: await symmetricEncrypt({ key, data: JSON.stringify(backupCodes(memberId)) }),
      verified: true,
    })
  await db().update(user).set({ twoFactorEnabled: true }).where(eq(user.id, memberId))
}
