import { AuthRefusal } from '@/hooks/use-auth'
import { NoAnswer } from '@/shared/api/call'

// The same sentence for a wrong password and an unknown address: nobody learns who has an account.
const sentences: Record<string, string> = {
  INVALID_EMAIL_OR_PASSWORD: 'That e-mail address and password do not go together.',
  INVALID_PASSWORD: 'That is not your password.',
  INVALID_EMAIL: 'That does not look like an e-mail address.',
  INVALID_CODE: 'That code does not match. Codes change every 30 seconds: use the one showing now.',
  INVALID_BACKUP_CODE: 'That backup code does not match, or it was used before.',
  INVALID_TWO_FACTOR_COOKIE: 'That took too long. Sign in once more, then enter the code.',
  INVALID_TOKEN: 'That link was used before, or it is too old.',
  TOO_MANY_ATTEMPTS_REQUEST_NEW_CODE: 'Too many tries. Sign in once more for a fresh start.',
  ACCOUNT_TEMPORARILY_LOCKED: 'Too many wrong codes. Wait a while before you try again.',
  TOTP_ALREADY_ENABLED: 'A second factor is already set up for this account.',
}

/** What to say about a refused act of signing in: a sentence for the form. */
export function refusalWords(error: unknown): string {
  if (error instanceof NoAnswer) return error.message
  if (error instanceof AuthRefusal) return sentences[error.code] ?? error.message
  return 'Something broke on our side. Nothing is lost; try again in a moment.'
}

export function refusalCode(error: unknown): string {
  return error instanceof AuthRefusal ? error.code : ''
}
