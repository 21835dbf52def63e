import { APIError, createAuthMiddleware, getSessionFromCtx, isAPIError } from 'better-auth/api'

import { passwordFault } from '@/server/auth/password-fault'
import { emailChangeAskedMail } from '@/server/mail/letters/email-change-asked'
import { emailTakenMail } from '@/server/mail/letters/email-taken'
import { passwordChangedMail } from '@/server/mail/letters/password-changed'
import { queueMail } from '@/server/mail/queue-mail'

const PASSWORD_PATHS = ['/sign-up/email', '/reset-password', '/change-password']

type Ctx = Parameters<Parameters<typeof createAuthMiddleware>[0]>[0]

function given(ctx: Ctx, name: string): string {
  const body: unknown = ctx.body
  if (typeof body !== 'object' || body === null || !(name in body)) return ''
  const value: unknown = (body as Record<string, unknown>)[name]
  return typeof value === 'string' ? value : ''
}

function refuseCommon(password: string, email: string): void {
  const fault = password === '' ? null : passwordFault(password, email)
  if (fault) throw new APIError('UNPROCESSABLE_ENTITY', { code: 'PASSWORD_TOO_COMMON', message: fault })
}

/** better-auth changes an address for whoever holds a session; we ask for the password too, as for the password itself. */
async function requirePassword(ctx: Ctx, memberId: string): Promise<void> {
  const account = await ctx.context.internalAdapter.findCredentialAccount(memberId)
  const password = given(ctx, 'currentPassword').slice(0, 128)
  const isRight =
    Boolean(account?.password) &&
    (await ctx.context.password.verify({ hash: account?.password ?? '', password }))
  if (!isRight)
    throw new APIError('BAD_REQUEST', { code: 'INVALID_PASSWORD', message: 'That is not your password.' })
}

/** Before better-auth acts: common passwords, and the current one where an account changes hands. */
export const guardAccount = createAuthMiddleware(async (ctx) => {
  if (ctx.path === '/change-email') {
    const found = await getSessionFromCtx(ctx)
    if (found) await requirePassword(ctx, found.user.id)
    return undefined
  }
  if (!PASSWORD_PATHS.includes(ctx.path)) return undefined
  if (ctx.path !== '/change-password') {
    refuseCommon(given(ctx, 'newPassword') || given(ctx, 'password'), given(ctx, 'email'))
    return undefined
  }
  const found = await getSessionFromCtx(ctx)
  refuseCommon(given(ctx, 'newPassword'), found?.user.email ?? '')
  // A changed password ends every other sign-in, whether or not the caller asks for it.
  return { context: { body: { ...(ctx.body as object), revokeOtherSessions: true } } }
})

/**
 * After better-auth has acted: the owner is told by mail. The address in use hears of a change whether or not the new
 * one is taken, so that its silence tells nobody who has an account.
 */
export function tellAccount(origin: string) {
  return createAuthMiddleware(async (ctx) => {
    const { returned } = ctx.context
    if (isAPIError(returned)) return
    if (ctx.path === '/change-password') {
      const { user } = (returned ?? {}) as { user?: { name: string; email: string } }
      if (user) await queueMail(passwordChangedMail({ to: { name: user.name, email: user.email }, origin }))
    }
    if (ctx.path !== '/change-email') return
    const found = await getSessionFromCtx(ctx)
    const newEmail = given(ctx, 'newEmail').toLowerCase()
    if (!found || !newEmail) return
    const { name, email } = found.user
    await queueMail(emailChangeAskedMail({ to: { name, email }, newEmail, origin }))
    const taken = await ctx.context.internalAdapter.findUserByEmail(newEmail)
    if (taken) await queueMail(emailTakenMail({ to: { name: taken.user.name, email: taken.user.email } }))
  })
}
