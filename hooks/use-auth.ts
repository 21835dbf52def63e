import { useMutation, useQueryClient } from '@tanstack/react-query'

import { authBase } from '@/hooks/api'
import { NoAnswer } from '@/shared/api/call'

/** What better-auth refused, with its code and a sentence. */
export class AuthRefusal extends Error {
  constructor(
    readonly code: string,
    message: string,
    readonly status: number,
  ) {
    super(message)
    this.name = 'AuthRefusal'
  }
}

async function ask<T>(path: string, body: Record<string, unknown>): Promise<T> {
  let response: Response
  try {
    response = await fetch(`${authBase}${path}`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'x-tankward': '1' },
      body: JSON.stringify(body),
      credentials: 'include',
    })
  } catch {
    throw new NoAnswer()
  }
  const told = (await response.json().catch(() => ({}))) as { code?: string; message?: string }
  if (response.ok) return told as T
  if (response.status === 429) throw new AuthRefusal('TOO_OFTEN', 'Too many tries. Wait a few minutes.', 429)
  throw new AuthRefusal(told.code ?? 'REFUSED', told.message ?? 'That did not work.', response.status)
}

/** Signing in either works or asks for the second factor. */
export interface SignedIn {
  twoFactorRedirect?: boolean
}

interface AuthActs {
  signUp: { input: { name: string; email: string; password: string; callbackURL: string }; reply: object }
  signIn: { input: { email: string; password: string; callbackURL: string }; reply: SignedIn }
  signOut: { input: object; reply: object }
  askReset: { input: { email: string; redirectTo: string }; reply: object }
  reset: { input: { newPassword: string; token: string }; reply: object }
  resendVerification: { input: { email: string; callbackURL: string }; reply: object }
  startSecondFactor: { input: { password: string }; reply: { totpURI: string; backupCodes: string[] } }
  verifyCode: { input: { code: string }; reply: object }
  verifyBackupCode: { input: { code: string }; reply: object }
  stopSecondFactor: { input: { password: string }; reply: object }
  changeEmail: { input: { newEmail: string; currentPassword: string; callbackURL: string }; reply: object }
  changePassword: {
    input: { currentPassword: string; newPassword: string; revokeOtherSessions: true }
    reply: object
  }
}

const PATHS: Record<keyof AuthActs, string> = {
  signUp: '/sign-up/email',
  signIn: '/sign-in/email',
  signOut: '/sign-out',
  askReset: '/request-password-reset',
  reset: '/reset-password',
  resendVerification: '/send-verification-email',
  startSecondFactor: '/two-factor/enable',
  verifyCode: '/two-factor/verify-totp',
  verifyBackupCode: '/two-factor/verify-backup-code',
  stopSecondFactor: '/two-factor/disable',
  changeEmail: '/change-email',
  changePassword: '/change-password',
}

// Plain calls instead of better-auth's browser client: it would put 25 kB into the first load for twelve requests.
/** One act of signing in or out; afterwards everything known about the member before is forgotten. */
export function useAuthAct<A extends keyof AuthActs>(act: A) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (input: AuthActs[A]['input']) =>
      ask<AuthActs[A]['reply']>(PATHS[act], input as Record<string, unknown>),
    onSuccess: async () => {
      if (act === 'signOut') client.clear()
      else await client.invalidateQueries({ queryKey: ['me'] })
    },
  })
}
