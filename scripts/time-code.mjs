import { Buffer } from 'node:buffer'
import { createHmac } from 'node:crypto'

const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567'

/** Base32 of RFC 4648, with or without padding, spaces and small letters. @param {string} text */
export function bytesOfBase32(text) {
  const bytes = []
  let bits = 0
  let held = 0
  for (const letter of text.toUpperCase().replace(/[\s=]/g, '')) {
    const value = ALPHABET.indexOf(letter)
    if (value < 0) throw new Error(`"${letter}" is no letter of base32`)
    held = ((held << 5) | value) & 0xfff
    bits += 5
    if (bits >= 8) {
      bits -= 8
      bytes.push((held >> bits) & 0xff)
    }
  }
  return Buffer.from(bytes)
}

/**
 * The one-time code of that moment: RFC 6238 section 4 over RFC 4226 section 5.3.
 * @param {Uint8Array} secret @param {number} atSeconds since 1970
 * @param {{ digits?: number, periodSeconds?: number, hash?: 'sha1' | 'sha256' | 'sha512' }} [kind]
 */
export function timeCode(secret, atSeconds, { digits = 6, periodSeconds = 30, hash = 'sha1' } = {}) {
  const counter = Buffer.alloc(8)
  counter.writeBigUInt64BE(BigInt(Math.floor(atSeconds / periodSeconds)))
  const mac = createHmac(hash, secret).update(counter).digest()
  const offset = (mac.at(-1) ?? 0) & 0x0f
  const number = (mac.readUInt32BE(offset) & 0x7fffffff) % 10 ** digits
  return String(number).padStart(digits, '0')
}
