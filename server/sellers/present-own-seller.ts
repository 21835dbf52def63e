import type { SellerRow } from '@/server/sellers/seller-store'
import type { OwnSeller } from '@/shared/contracts/sellers'

export function payoutState(
  row: Pick<SellerRow, 'payoutAccountId' | 'chargesEnabled' | 'payoutsEnabled'>,
): OwnSeller['payouts'] {
  if (row.payoutAccountId === null) return 'not-started'
  return row.chargesEnabled && row.payoutsEnabled ? 'ready' : 'unfinished'
}

export function presentOwnSeller(row: SellerRow): OwnSeller {
  const { publicId, farmName, about, street, city, state, zip, phone, zone, licences } = row
  return {
    sellerId: publicId,
    farmName,
    about,
    kind: row.kind === 'grower' ? 'grower' : 'hatchery',
    street,
    city,
    state,
    zip,
    phone,
    zone,
    licences,
    publicPlace: { label: `${city}, ${state}`, lat: row.cellLat, lng: row.cellLng },
    payouts: payoutState(row),
  }
}
