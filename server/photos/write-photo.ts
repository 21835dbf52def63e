import { rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import sharp from 'sharp'

import type { DecodedPhoto } from '@/server/photos/decode-photo'
import { photoFolder } from '@/server/photos/photo-files'
import { photoFileName, photoWidths } from '@/server/photos/photo-widths'

const QUALITY = 78

const filesOf = (photoId: string) =>
  photoWidths.map((width) => ({ width, file: path.join(photoFolder(), photoFileName(photoId, width)) }))

export async function removePhotoFiles(photoId: string): Promise<void> {
  await Promise.all(filesOf(photoId).map(({ file }) => rm(file, { force: true })))
}

/** Writes the three sizes; leaves none behind when one cannot be written. */
export async function writePhoto(photoId: string, photo: DecodedPhoto): Promise<void> {
  const raw = { width: photo.widthPx, height: photo.heightPx, channels: 3 as const }
  try {
    for (const { width, file } of filesOf(photoId)) {
      const encoded = await sharp(photo.pixels, { raw })
        .resize({ width, height: 2 * width, fit: 'inside', withoutEnlargement: true })
        .webp({ quality: QUALITY })
        .toBuffer()
      await writeFile(file, encoded, { flag: 'wx', mode: 0o640 })
    }
  } catch (error) {
    await removePhotoFiles(photoId)
    throw error
  }
}
