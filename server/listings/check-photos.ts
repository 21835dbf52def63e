import type { PhotoRow } from '@/server/photos/photo-store'
import type { FieldProblem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'

/** Every photo was uploaded by the seller, and stands once. Another's photo is answered like a missing one. */
export function checkPhotos(body: ListingBody, photos: PhotoRow[], memberId: string): FieldProblem[] {
  return body.photos.flatMap(({ photoId }, at) => {
    const pointer = `#/draft/photos/${at}/photoId`
    const row = photos.find((photo) => photo.id === photoId)
    if (row?.memberId !== memberId) return [{ detail: 'That photo is gone: upload it again.', pointer }]
    const isTwice = body.photos.findIndex((photo) => photo.photoId === photoId) < at
    return isTwice ? [{ detail: 'The same photo is there twice.', pointer }] : []
  })
}
