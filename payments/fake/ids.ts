import { randomBytes } from 'node:crypto'

const ALPHABET = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz'

/** `pi_` + 24 letters and digits; the modulo bias does not matter for an id. */
export function newId(prefix: string): string {
  return `${prefix}_${Array.from(randomBytes(24), (byte) => ALPHABET[byte % ALPHABET.length]).join('')}`
}
