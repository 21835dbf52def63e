import sharp from 'sharp'

import type { DecodedPhoto } from '@/server/photos/decode-photo'

const raw = ({ widthPx, heightPx }: DecodedPhoto) => ({
  raw: { width: widthPx, height: heightPx, channels: 3 as const },
})

/** Difference hash: is each of 9 × 8 grey points darker than its right neighbour? Near copies differ in few bits. */
async function differenceHash(photo: DecodedPhoto): Promise<string> {
  const grey = await sharp(photo.pixels, raw(photo))
    .greyscale()
    .resize({ width: 9, height: 8, fit: 'fill' })
    .raw()
    .toBuffer()
  let bits = ''
  for (let row = 0; row < 8; row++) {
    for (let column = 0; column < 8; column++) {
      const at = row * 9 + column
      bits += (grey[at] ?? 0) < (grey[at + 1] ?? 0) ? '1' : '0'
    }
  }
  return BigInt(`0b${bits}`).toString(16).padStart(16, '0')
}

async function averageColour(photo: DecodedPhoto): Promise<string> {
  const one = await sharp(photo.pixels, raw(photo))
    .resize({ width: 1, height: 1, fit: 'fill' })
    .raw()
    .toBuffer()
  return `#${one.subarray(0, 3).toString('hex')}`
}

/** What is kept about a picture beside its pixels. */
export async function lookAtPhoto(photo: DecodedPhoto): Promise<{ looksLike: string; ground: string }> {
  const [looksLike, ground] = await Promise.all([differenceHash(photo), averageColour(photo)])
  return { looksLike, ground }
}
