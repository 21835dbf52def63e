import { createHash } from 'node:crypto'

/** The same words give the same bits: seeded addresses stay good from one build of the demo to the next. */
function bytesFor(words: string): Buffer {
  return createHash('sha256').update(`tankward:${words}`).digest()
}

/** 22 characters in the form of a public id. */
export function seededPublicId(words: string): string {
  return bytesFor(words).subarray(0, 16).toString('base64url')
}

/** In the form of a UUID, as better-auth keys its people. */
export function seededUuid(words: string): string {
  const hex = bytesFor(words).toString('hex')
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-a${hex.slice(17, 20)}-${hex.slice(20, 32)}`
}
