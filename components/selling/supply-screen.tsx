import { lazy } from 'react'

import type { SupplyKind } from '@/components/forms/supplies/supply-kind'
import type { OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  kind: SupplyKind
  own: OwnListing
  farm: OwnSeller
  units: UnitSystem
}

/** The form and what it knows of its goods, fetched together. */
export const SupplyScreen = lazy(async () => {
  const [{ SupplyDesk }, goods] = await Promise.all([
    import('@/components/forms/forms-group'),
    import('@/components/forms/supplies/supplies-group'),
  ])
  return { default: (props: Props) => <SupplyDesk {...props} goods={goods} /> }
})
