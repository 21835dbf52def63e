import { theAuth } from '@/server/auth/auth'

const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567'

/** RFC 4648 base 32, without padding. */
function fromBase32(text: string): string {
  const bits = [...text].map((letter) => ALPHABET.indexOf(letter).toString(2).padStart(5, '0')).join('')
  const bytes = bits.match(/.{8}/g) ?? []
  return Buffer.from(bytes.map((byte) => parseInt(byte, 2))).toString('utf8')
}

/** The six digits an authenticator shows now for the address that set-up printed. */
export async function totpOf(totpUri: string): Promise<string> {
  const secret = new URL(totpUri).searchParams.get('secret') ?? ''
  const { code } = await theAuth().api.generateTOTP({ body: { secret: fromBase32(secret) } })
  return code
}
