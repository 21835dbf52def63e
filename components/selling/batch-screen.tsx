import { lazy, useEffect } from 'react'

import { BatchPage } from './batch-page'
import { kindOf } from './kind-of'
import { OwnListingGate } from './own-listing-gate'
import { SellerGate } from './seller-gate'
import { SupplyScreen } from './supply-screen'

import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useUnits } from '@/hooks/use-units'

const loadForms = () => import('@/components/forms/forms-group')
const BatchDesk = lazy(() => loadForms().then((group) => ({ default: group.BatchDesk })))

interface Props {
  listingId: string
  /** A field to open with, named by a moderator's question. */
  atField?: string
}

export function BatchScreen({ listingId, atField }: Props) {
  const units = useUnits()
  useEffect(() => {
    void loadForms() // on its way while the listing is read
  }, [])
  return (
    <SellerGate frame={BatchPage}>
      {(farm) => (
        <OwnListingGate listingId={listingId} isFresh frame={BatchPage}>
          {(own) => {
            const kind = kindOf(own)
            return (
              <LazyPart label="Loading the form" fallback={<FormLoading />}>
                {kind === 'fish' ? (
                  <BatchDesk own={own} farm={farm} units={units} atField={atField} />
                ) : (
                  <SupplyScreen kind={kind} own={own} farm={farm} units={units} />
                )}
              </LazyPart>
            )
          }}
        </OwnListingGate>
      )}
    </SellerGate>
  )
}

function FormLoading() {
  return (
    <BatchPage>
      <SkeletonRows label="Loading the form" rows={5} />
    </BatchPage>
  )
}
