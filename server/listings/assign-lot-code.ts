import type { Tx } from '@/db/transaction'
import { listLotCodes, lockSellersLots } from '@/server/listings/lot-code-store'
import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'
import { isLotCodeOf, nextLotCode } from '@/shared/domain/produce/lot-code'

interface Lot {
  body: ListingBody
  /** What this listing was submitted as before. */
  latest: ListingBody | null
  listingId: number
  sellerId: number
}

function refuse(detail: string): never {
  throw new Problem('listing-incomplete', undefined, { errors: [{ detail, pointer: '#/draft/lotCode' }] })
}

/** The code the same harvest had when it was submitted before: a recall finds it under one name. */
function keptCode({ body, latest }: Lot): string | undefined {
  if (body.category !== 'produce' || latest?.category !== 'produce') return undefined
  const { lotCode } = latest
  return lotCode !== undefined && isLotCodeOf(lotCode, body.harvest.day) ? lotCode : undefined
}

/** A harvest under its lot code: the one given, kept or next. One seller's harvest of a day has each code once. */
export async function assignLotCode(lot: Lot, tx: Tx): Promise<ListingBody> {
  const { body, listingId, sellerId } = lot
  if (body.category !== 'produce') return body
  await lockSellersLots(sellerId, tx)
  const { day, bed } = body.harvest
  const taken = await listLotCodes({ sellerId, exceptListingId: listingId, harvestDay: day }, tx)
  const wanted = body.lotCode ?? keptCode(lot)
  if (wanted !== undefined && !taken.includes(wanted)) return { ...body, lotCode: wanted }
  if (body.lotCode !== undefined) {
    refuse(`${body.lotCode} is another harvest of yours that day. Leave it empty and we write one.`)
  }
  const lotCode = nextLotCode(day, bed ?? null, taken)
  if (lotCode === null) refuse('That bed has a hundred lots on that day: name another bed.')
  return { ...body, lotCode }
}
