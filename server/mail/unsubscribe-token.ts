import { createHmac, hkdfSync, timingSafeEqual } from 'node:crypto'

/** What a member may switch off, by name. */
export const mailLists = ['reminders'] as const
export type MailList = (typeof mailLists)[number]

interface Settings {
  origin: string
  secret: string
}

let settings: { origin: string; key: Buffer } | undefined

export function configureUnsubscribe({ origin, secret }: Settings): void {
  // A key of its own: a token of any other kind, signed with the same secret, is worth nothing here.
  settings = {
    origin,
    key: Buffer.from(hkdfSync('sha256', secret, '', 'tankward one-click unsubscribe', 32)),
  }
}

function ready(): NonNullable<typeof settings> {
  if (!settings) throw new Error('configureUnsubscribe() has not been called')
  return settings
}

const sign = (text: string) => createHmac('sha256', ready().key).update(text).digest('base64url')

export interface Leaving {
  list: MailList
  memberId: string
}

/** It names one list of one member and does nothing else; mails are read late, so it does not expire. */
export function writeUnsubscribeToken({ list, memberId }: Leaving): string {
  const named = Buffer.from(`${list}:${memberId}`).toString('base64url')
  return `${named}.${sign(named)}`
}

/** Null for whatever we did not sign. */
export function readUnsubscribeToken(token: string): Leaving | null {
  const [named = '', signature = '', ...more] = token.split('.')
  const wanted = Buffer.from(sign(named))
  const given = Buffer.from(signature)
  if (more.length > 0 || given.length !== wanted.length || !timingSafeEqual(given, wanted)) return null
  const [list, memberId = ''] = Buffer.from(named, 'base64url').toString().split(':')
  const known = mailLists.find((one) => one === list)
  return known ? { list: known, memberId } : null
}

export function unsubscribeUrl(leaving: Leaving): string {
  return `${ready().origin}/unsubscribe/${writeUnsubscribeToken(leaving)}`
}
