import { presentMarks, presentSellerCard } from '@/server/sellers/present-seller-card'
import { findSellerByPublicId } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { readSeller as readSellerCall } from '@/shared/contracts/sellers'

export async function readSeller(publicId: string): Promise<ReplyOf<typeof readSellerCall>> {
  const row = await findSellerByPublicId(publicId)
  if (!row) throw new Problem('not-found')
  const marks = presentMarks(row)
  return {
    ...presentSellerCard(row),
    ...(marks ? { marks } : {}),
    about: row.about,
    licences: row.licences.map(({ state, answer }) => ({ state, answer })),
  }
}
