import { fromNodeHeaders } from 'better-auth/node'
import type { Request } from 'express'

import { theAuth } from '@/server/auth/auth'
import type { Caller } from '@/server/http/caller'
import type { Role } from '@/shared/api/endpoint'

const ROLES: Role[] = ['member', 'seller', 'moderator', 'admin']

export function rolesOf(text: string | null | undefined): Role[] {
  const named = (text ?? '').split(',').map((role) => role.trim())
  return ROLES.filter((role) => role === 'member' || named.includes(role))
}

/** The signed-in member behind a request, or null. Reads the session table: signing out takes effect at once. */
export async function readCaller(req: Request): Promise<Caller | null> {
  if (!req.headers.cookie) return null
  const found = await theAuth().api.getSession({ headers: fromNodeHeaders(req.headers) })
  if (!found) return null
  const { user, session } = found
  return {
    memberId: user.id,
    name: user.name,
    email: user.email,
    emailVerified: user.emailVerified,
    roles: rolesOf(user.role),
    hasSecondFactor: user.twoFactorEnabled === true,
    sessionId: session.id,
  }
}
