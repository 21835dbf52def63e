import { randomBytes } from 'node:crypto'

/** 128 random bits, base64url: 22 characters that nobody can guess or count. */
export function newPublicId(): string {
  return randomBytes(16).toString('base64url')
}
