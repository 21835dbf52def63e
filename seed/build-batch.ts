import { createHash } from 'node:crypto'

import { TZDate } from '@date-fns/tz'
import { eq } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { listing, listingVersion, pickupWindow, stockMovement } from '@/db/schema/listings'
import { photo } from '@/db/schema/photos'
import { batchBody } from '@/seed/batch-body'
import type { BuiltSeller } from '@/seed/build-seller'
import { seededPublicId } from '@/seed/seeded-id'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { listingBody, type ListingBody, type ListingDraft } from '@/shared/contracts/listings'

export interface BuiltBatch {
  id: number
  publicId: string
  versionId: number
  body: ListingBody
  windows: { id: number; publicId: string; startsAt: Date; endsAt: Date }[]
}

interface BatchWish {
  seller: BuiltSeller
  /** Tells batches of one seller apart; the same name always gets the same address. */
  name: string
  /** The day the batch was listed; every date of the body hangs on it unless given. */
  at: Date
  /** Free to order; 500 unless said. */
  free?: number
  state?: 'live' | 'paused' | 'sold_out' | 'expired'
  body?: Partial<FishBody>
  /** A whole listing of another category, in the place of a batch of fish. */
  whole?: ListingBody
  /** Not built: the photos are there already. */
  hasPhotos?: boolean
}

type Typed = ListingBody['windows'][number]

function instant(dayText: string, time: string, zone: string): Date {
  const [year = 0, month = 1, date = 1] = dayText.split('-').map(Number)
  const [hour = 0, minute = 0] = time.split(':').map(Number)
  const local = new TZDate(year, month - 1, date, hour, minute, 0, 0, zone)
  return new Date(local.getTime())
}

async function buildWindows(db: Tx, batch: { listingId: number; body: ListingBody }, wish: BatchWish) {
  const { listingId, body } = batch
  const { zone } = wish.seller
  const rows = body.windows.map(({ day, from, until, capacity }: Typed, at) => ({
    publicId: seededPublicId(`window ${wish.seller.publicId} ${wish.name} ${at}`),
    ...{ listingId, startsAt: instant(day, from, zone), endsAt: instant(day, until, zone), zone, capacity },
    placeKind: body.placeKind,
  }))
  await db.insert(pickupWindow).values(rows)
  return db.select().from(pickupWindow).where(eq(pickupWindow.listingId, listingId)).orderBy(pickupWindow.id)
}

/** Rows of photos without files, for places that show no pictures. */
async function buildPhotos(db: Tx, wish: BatchWish): Promise<ListingBody['photos']> {
  const id = createHash('sha256')
    .update(`photo ${wish.seller.publicId} ${wish.name}`)
    .digest('hex')
    .slice(0, 32)
  const looks = { widthPx: 1600, heightPx: 1200, looksLike: id.slice(0, 16), ground: '#8a9a7b' }
  await db
    .insert(photo)
    .values({ id, memberId: wish.seller.memberId, ...looks, takenOn: null, bytes: 1, createdAt: wish.at })
  const takenOn = wish.at.toISOString().slice(0, 10)
  return [{ photoId: id, takenOn, hasRuler: true }]
}

/**
 * A batch as an approved listing: version 1, its pickup windows and the stock movement that put it on sale. Search
 * does not know of it until it is projected. Throws when the body would not pass the form.
 */
export async function buildBatch(db: Tx, wish: BatchWish): Promise<BuiltBatch> {
  const { seller, name, at } = wish
  const free = wish.free ?? wish.whole?.countOnHand ?? wish.body?.countOnHand ?? 500
  const photos = wish.hasPhotos ? {} : { photos: await buildPhotos(db, wish) }
  const counted = { countOnHand: Math.max(free, wish.body?.minOrder ?? 25), ...wish.body }
  const body = listingBody.parse(
    wish.whole ? { ...wish.whole, ...photos } : batchBody(at, { ...counted, ...photos }),
  )
  const publicId = seededPublicId(`batch ${seller.publicId} ${name}`)
  const [made] = await db
    .insert(listing)
    .values({
      ...{
        publicId,
        sellerId: seller.id,
        category: body.category,
        state: wish.state ?? 'live',
        liveVersion: 1,
      },
      ...{ draft: body as ListingDraft, free, createdAt: at, updatedAt: at },
    })
    .$returningId()
  const id = made?.id ?? 0
  const decided = { review: 'approved', flags: ['new'], submittedAt: at, decidedAt: at }
  const [version] = await db
    .insert(listingVersion)
    .values({ listingId: id, number: 1, body: body as ListingDraft, ...decided })
    .$returningId()
  const put = { listingId: id, reason: 'published', free, by: seller.memberId, commandId: 'published', at }
  if (free > 0) await db.insert(stockMovement).values(put)
  const windows = await buildWindows(db, { listingId: id, body }, wish)
  return { id, publicId, versionId: version?.id ?? 0, body, windows }
}
