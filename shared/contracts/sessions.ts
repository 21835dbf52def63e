import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { instantText } from '@/shared/contracts/values'

export const shownSession = z.object({
  sessionId: z.string(),
  /** "Firefox on Windows", from what the browser said of itself. */
  device: z.string(),
  startedAt: instantText,
  /** Kept to the hour. */
  lastUsedAt: instantText,
  isThis: z.boolean(),
})
export type ShownSession = z.output<typeof shownSession>

export const listSessions = endpoint({
  method: 'GET',
  path: '/me/sessions',
  auth: 'member',
  summary: 'Where the member is signed in, this sign-in first',
  reply: z.object({ items: z.array(shownSession) }),
})

export const endSession = endpoint({
  method: 'DELETE',
  path: '/me/sessions/:sessionId',
  auth: 'member',
  status: 204,
  summary: 'Sign out one device of the member',
  params: z.object({ sessionId: z.uuid() }),
})

export const endOtherSessions = endpoint({
  method: 'DELETE',
  path: '/me/sessions',
  auth: 'member',
  status: 204,
  summary: 'Sign out every other device of the member',
})
