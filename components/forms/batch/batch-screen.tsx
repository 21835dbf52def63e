import { BatchDesk } from './batch-desk'

import { BatchPage } from '@/components/selling/batch-page'
import { OwnListingGate } from '@/components/selling/own-listing-gate'
import { SellerGate } from '@/components/selling/seller-gate'
import { useUnits } from '@/hooks/use-units'

interface Props {
  listingId: string
  /** A field to open with, named by a moderator's question. */
  atField?: string
}

export function BatchScreen({ listingId, atField }: Props) {
  const units = useUnits()
  return (
    <SellerGate frame={BatchPage}>
      {(farm) => (
        <OwnListingGate listingId={listingId} isFresh frame={BatchPage}>
          {(own) => <BatchDesk own={own} farm={farm} units={units} atField={atField} />}
        </OwnListingGate>
      )}
    </SellerGate>
  )
}
