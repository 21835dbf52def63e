import type { ListingBody } from '@/shared/contracts/listings'
import { lotTitle } from '@/shared/domain/listings/lot-title'

export interface ListingFace {
  title: string
  photo?: { photoId: string; ground: string; alt: string }
}

/** Shown while a picture loads, where its own colour was not looked up. */
const PLAIN_GROUND = '#e4e9f1'

/** What a picture is said to show, for whoever does not see it. */
export function photoAlt(body: ListingBody, at: number): string {
  const photo = body.photos[at]
  const ruler = photo?.hasRuler ? ', beside a ruler' : ''
  return photo?.caption || `${lotTitle(body)}${ruler}, photo ${at + 1} of ${body.photos.length}`
}

/** Name and first picture of a batch; `grounds` holds the pictures' own colours by their ids. */
export function describeListing(body: ListingBody, grounds?: ReadonlyMap<string, string>): ListingFace {
  const [first] = body.photos
  return {
    title: lotTitle(body),
    ...(first
      ? {
          photo: {
            photoId: first.photoId,
            ground: grounds?.get(first.photoId) ?? PLAIN_GROUND,
            alt: photoAlt(body, 0),
          },
        }
      : {}),
  }
}
