import type { Access, Role } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'

/** Who is asking: made once a request from the session, handed to every use case. */
export interface Caller {
  memberId: string
  name: string
  email: string
  emailVerified: boolean
  roles: Role[]
  hasSecondFactor: boolean
  /** The sign-in behind this request. */
  sessionId: string
}

const STAFF: Role[] = ['moderator', 'admin']

export function isStaff(caller: Caller): boolean {
  return caller.roles.some((role) => STAFF.includes(role))
}

function holds(caller: Caller, role: Role): boolean {
  if (role === 'member') return true
  // An admin may do what a moderator may; selling is never implied by a staff role.
  if (role === 'moderator') return isStaff(caller)
  return caller.roles.includes(role)
}

/** Refuses a caller without the access an endpoint asks; staff acts need the second factor as well. */
export function admit(caller: Caller | null, access: Access): void {
  if (access === 'public') return
  if (!caller) throw new Problem('not-signed-in', 'Sign in, then try again. What you typed is kept.')
  if (!holds(caller, access)) throw new Problem('not-allowed')
  if (STAFF.includes(access) && !caller.hasSecondFactor) {
    throw new Problem('second-factor-needed', 'Staff accounts need a second factor: set it up under Me.')
  }
}
