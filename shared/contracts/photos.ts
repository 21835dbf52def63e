import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { dayText, photoId } from '@/shared/contracts/values'

/** What the upload accepts; the page of accepted files is printed from these same numbers. */
export const photoLimits = {
  mostBytes: 8 * 1024 * 1024,
  mostPixels: 40_000_000,
  kinds: ['image/jpeg', 'image/png', 'image/webp'],
} as const

export const uploadedPhoto = z.object({
  photoId,
  widthPx: z.int(),
  heightPx: z.int(),
  ground: z.string(),
  takenOn: dayText.optional(),
})
export type UploadedPhoto = z.output<typeof uploadedPhoto>

export const uploadPhoto = endpoint({
  method: 'POST',
  path: '/photos',
  auth: 'member',
  upload: true,
  status: 201,
  summary: 'Upload one photo; it is re-encoded and its place data removed',
  reply: uploadedPhoto,
})
