import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { instantText, pageOf, publicIdText } from '@/shared/contracts/values'

export const noticeKinds = [
  'request',
  'accepted',
  'scheduled',
  'moved',
  'ready',
  'handed-over',
  'dispatched',
  'arrived',
  'late-box',
  'settled',
  'ended',
  'unclear',
  'weather-held',
  'quantity-cut',
  'no-show',
  'evening-before',
  'two-hours-before',
  'day-seven',
  'rated',
  'rating-reply',
  'listing-approved',
  'listing-asked',
  'listing-rejected',
  'listing-taken-down',
] as const
export type NoticeKind = (typeof noticeKinds)[number]

export const noticeFacts = z.object({
  /** What happened, in the words of the mail. */
  subject: z.string(),
  /** What it is about: the name of the batch. */
  title: z.string(),
})
export type NoticeFacts = z.output<typeof noticeFacts>

export const shownNotice = z.object({
  noticeId: publicIdText,
  kind: z.enum(noticeKinds),
  ...noticeFacts.shape,
  about: z.object({ noun: z.enum(['order', 'listing']), id: publicIdText }),
  createdAt: instantText,
  readAt: instantText.optional(),
})
export type ShownNotice = z.output<typeof shownNotice>

/** Counted up to a hundred: nobody reads a larger number, and the count stays cheap. */
export const unread = z.object({ unread: z.int().min(0).max(100) })

export const listNotices = endpoint({
  method: 'GET',
  path: '/notices',
  auth: 'member',
  summary: 'What the member was told, newest first',
  query: z.object({
    cursor: z.string().max(400).optional(),
    limit: z.coerce.number().int().min(1).max(50).default(20),
  }),
  reply: pageOf(shownNotice),
})

export const countUnreadNotices = endpoint({
  method: 'GET',
  path: '/notices/unread-count',
  auth: 'member',
  summary: 'How many notices wait to be read, up to a hundred',
  reply: unread,
})

export const readNotice = endpoint({
  method: 'POST',
  path: '/notices/:noticeId/reading',
  auth: 'member',
  summary: 'Mark one notice read; the same again changes nothing',
  params: z.object({ noticeId: publicIdText }),
  reply: unread,
})

export const readAllNotices = endpoint({
  method: 'POST',
  path: '/notices/readings',
  auth: 'member',
  summary: 'Mark every notice read',
  reply: unread,
})
