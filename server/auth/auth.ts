import { betterAuth } from 'better-auth'
import { drizzleAdapter } from 'better-auth/adapters/drizzle'
import { twoFactor } from 'better-auth/plugins'

import { db } from '@/db/client'
import * as tables from '@/db/schema/auth'
import { guardAccount, tellAccount } from '@/server/auth/guard-account'
import { isEmailChange } from '@/server/auth/is-email-change'
import { MOST_PASSWORD, LEAST_PASSWORD } from '@/server/auth/password-fault'
import { confirmNewEmailMail } from '@/server/mail/letters/confirm-new-email'
import { log } from '@/server/log'
import { queueMail } from '@/server/mail/queue-mail'
import { resetPasswordMail } from '@/server/mail/letters/reset-password'
import { signUpAgainMail } from '@/server/mail/letters/sign-up-again'
import { verifyEmailMail } from '@/server/mail/letters/verify-email'

export interface AuthSettings {
  secret: string
  origin: string
  /** Other names of the same loopback address, so that opening `localhost` is not a forged request. */
  alsoTrusted: string[]
}

const MINUTE = 60

function build(settings: AuthSettings) {
  return betterAuth({
    appName: 'Tankward',
    baseURL: settings.origin,
    basePath: '/api/auth',
    secret: settings.secret,
    // Its own lines would stand among ours unstructured; what it adds to a message may be anything.
    logger: { log: (level, message) => log[level](`auth: ${message}`) },
    trustedOrigins: [settings.origin, ...settings.alsoTrusted],
    database: drizzleAdapter(db(), { provider: 'mysql', schema: tables, transaction: true }),
    emailAndPassword: {
      enabled: true,
      minPasswordLength: LEAST_PASSWORD,
      maxPasswordLength: MOST_PASSWORD,
      requireEmailVerification: true,
      revokeSessionsOnPasswordReset: true,
      resetPasswordTokenExpiresIn: 10 * MINUTE,
      sendResetPassword: async ({ user, url }) => queueMail(resetPasswordMail({ to: user, url })),
      // The screen says the same for a known and an unknown address; the owner of a known one is told by mail.
      onExistingUserSignUp: async ({ user }) =>
        queueMail(signUpAgainMail({ to: user, origin: settings.origin })),
    },
    emailVerification: {
      sendOnSignUp: true,
      sendOnSignIn: true,
      autoSignInAfterVerification: true,
      expiresIn: 60 * MINUTE,
      sendVerificationEmail: async ({ user, url, token }) =>
        queueMail(
          isEmailChange(token) ? confirmNewEmailMail({ to: user, url }) : verifyEmailMail({ to: user, url }),
        ),
    },
    user: {
      // Without a confirmation from the old address: who lost that mailbox could never leave it. It is told instead.
      changeEmail: { enabled: true },
      additionalFields: { role: { type: 'string', required: false, input: false, defaultValue: 'member' } },
    },
    session: {
      expiresIn: 7 * 24 * 60 * MINUTE,
      // Also how finely the account page can say when a device was last used.
      updateAge: 60 * MINUTE,
      cookieCache: { enabled: false },
    },
    // They would hand session tokens to scripts; server/sessions lists and ends sign-ins by their ids.
    disabledPaths: ['/list-sessions', '/revoke-session', '/revoke-sessions', '/revoke-other-sessions'],
    rateLimit: {
      enabled: true,
      storage: 'database',
      window: MINUTE,
      max: 100,
      customRules: {
        '/sign-in/email': { window: 15 * MINUTE, max: 10 },
        '/sign-up/email': { window: 10 * MINUTE, max: 6 },
        '/request-password-reset': { window: 10 * MINUTE, max: 3 },
        '/send-verification-email': { window: 10 * MINUTE, max: 3 },
        '/two-factor/verify-totp': { window: MINUTE, max: 5 },
        '/two-factor/verify-backup-code': { window: MINUTE, max: 5 },
        '/change-email': { window: 15 * MINUTE, max: 6 },
        '/change-password': { window: 15 * MINUTE, max: 10 },
        '/verify-password': { window: 15 * MINUTE, max: 10 },
        '/get-session': false,
      },
    },
    advanced: {
      database: { generateId: 'uuid' },
      // Test settings would otherwise switch the origin check off.
      disableOriginCheck: false,
      useSecureCookies: settings.origin.startsWith('https://'),
      ipAddress: { ipAddressHeaders: ['x-tankward-ip'] },
    },
    plugins: [twoFactor({ issuer: 'Tankward', skipVerificationOnEnable: false })],
    hooks: { before: guardAccount, after: tellAccount(settings.origin) },
  })
}

export type Auth = ReturnType<typeof build>

let auth: Auth | undefined

export function openAuth(settings: AuthSettings): Auth {
  auth = build(settings)
  return auth
}

export function theAuth(): Auth {
  if (!auth) throw new Error('openAuth() has not been called')
  return auth
}
