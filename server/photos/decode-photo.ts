import { fileTypeFromFile } from 'file-type'
import sharp, { type Metadata } from 'sharp'

import { readExifDate } from '@/server/photos/read-exif-date'
import { photoWidths } from '@/server/photos/photo-widths'
import { photoLimits } from '@/shared/contracts/photos'
import { Problem } from '@/shared/api/problem'

// One core a picture and nothing kept: memory stays flat however many photos come.
sharp.cache(false)
sharp.concurrency(1)

const WIDEST = Math.max(...photoWidths)
const kinds: readonly string[] = photoLimits.kinds
const formats = ['jpeg', 'png', 'webp']

/** Bare pixels: nothing of the file's other contents is left. */
export interface DecodedPhoto {
  pixels: Buffer
  widthPx: number
  heightPx: number
  takenOn: string | null
}

const unreadable = () =>
  new Problem('wrong-kind', 'That file could not be read as a photo. JPEG, PNG and WebP are fine.')

function checkSize(found: Metadata): void {
  if (!formats.includes(found.format)) throw unreadable()
  if (found.width * found.height > photoLimits.mostPixels) {
    throw new Problem('too-large', 'That photo has more than 40 megapixels. A smaller copy will do.')
  }
}

async function readPixels(path: string): Promise<DecodedPhoto> {
  const source = sharp(path, { limitInputPixels: photoLimits.mostPixels, failOn: 'error' })
  const found = await source.metadata()
  checkSize(found)
  const { data, info } = await source
    .rotate()
    .flatten({ background: '#ffffff' })
    .resize({ width: WIDEST, height: 2 * WIDEST, fit: 'inside', withoutEnlargement: true })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true })
  if (info.channels !== 3) throw unreadable()
  return { pixels: data, widthPx: info.width, heightPx: info.height, takenOn: readExifDate(found.exif) }
}

/** Decodes by content, never by name: sharp would read SVG and more if it were let. */
export async function decodePhoto(path: string): Promise<DecodedPhoto> {
  const kind = await fileTypeFromFile(path)
  if (!kind || !kinds.includes(kind.mime)) {
    throw new Problem('wrong-kind', 'Photos may be JPEG, PNG or WebP files.')
  }
  try {
    return await readPixels(path)
  } catch (error) {
    if (error instanceof Problem) throw error
    if (error instanceof Error && /pixel limit/i.test(error.message)) {
      throw new Problem('too-large', 'That photo has more than 40 megapixels. A smaller copy will do.')
    }
    throw unreadable()
  }
}
