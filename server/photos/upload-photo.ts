import { randomBytes } from 'node:crypto'

import { limitCalls } from '@/server/http/call-limit'
import type { Caller } from '@/server/http/caller'
import type { UploadedFile } from '@/server/http/uploaded-file'
import { decodePhoto } from '@/server/photos/decode-photo'
import { inTurn } from '@/server/photos/in-turn'
import { lookAtPhoto } from '@/server/photos/look-at-photo'
import { insertPhoto, sumUploaded, type PhotoRow } from '@/server/photos/photo-store'
import { removePhotoFiles, writePhoto } from '@/server/photos/write-photo'
import { Problem } from '@/shared/api/problem'
import type { UploadedPhoto } from '@/shared/contracts/photos'

const DAY_MS = 86_400_000
const MOST_BYTES_A_DAY = 200 * 1024 * 1024

async function checkLimits(caller: Caller, bytes: number): Promise<void> {
  await limitCalls({ name: 'upload', windowS: 3600, most: 30 }, caller.memberId)
  const today = await sumUploaded(caller.memberId, new Date(Date.now() - DAY_MS))
  if (today + bytes > MOST_BYTES_A_DAY) {
    throw new Problem('too-often', 'That is 200 MB of photos in a day. Go on tomorrow.', {
      facts: { retryAfterS: 3600 },
    })
  }
}

async function keep(caller: Caller, file: UploadedFile): Promise<PhotoRow> {
  const decoded = await decodePhoto(file.path)
  const looks = await lookAtPhoto(decoded)
  const { widthPx, heightPx, takenOn } = decoded
  const id = randomBytes(16).toString('hex')
  await writePhoto(id, decoded)
  // Limits count real days, so the row carries real time.
  const row = {
    id,
    memberId: caller.memberId,
    widthPx,
    heightPx,
    ...looks,
    takenOn,
    bytes: file.bytes,
    createdAt: new Date(),
  }
  try {
    await insertPhoto(row)
  } catch (error) {
    await removePhotoFiles(id)
    throw error
  }
  return row
}

/** Keeps a photo as bare pixels at three sizes: place, camera and whatever else the file carried are gone. */
export async function uploadPhoto(caller: Caller, file: UploadedFile): Promise<UploadedPhoto> {
  try {
    await checkLimits(caller, file.bytes)
    const { id, widthPx, heightPx, ground, takenOn } = await inTurn(() => keep(caller, file))
    return { photoId: id, widthPx, heightPx, ground, ...(takenOn ? { takenOn } : {}) }
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOSPC') {
      throw new Problem(
        'storage-full',
        'Our photo store is full. Your text is kept; try the photo again later.',
      )
    }
    throw error
  } finally {
    await file.remove()
  }
}
