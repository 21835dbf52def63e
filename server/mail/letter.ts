import type { Leaving } from '@/server/mail/unsubscribe-token'

/** One mail before it is sent: words only; the frame and the plain part are made from the same blocks. */
export interface Letter {
  to: { name: string; email: string }
  subject: string
  /** First line of the mail and of its preview. */
  heading: string
  blocks: LetterBlock[]
  /** Set on what a member may switch off: which list, and whose. Such mail carries one-click unsubscribe. */
  optional?: Leaving
  /** Attached calendar file. */
  calendar?: { fileName: string; method: 'PUBLISH' | 'CANCEL'; text: string }
}

export type LetterBlock =
  | { kind: 'text'; text: string }
  | { kind: 'facts'; rows: [name: string, value: string][] }
  | { kind: 'button'; label: string; url: string }
  | { kind: 'caution'; text: string }
  | { kind: 'code'; label: string; code: string }
  | { kind: 'tag'; title: string; size: string; count: string; price: string; place: string }
