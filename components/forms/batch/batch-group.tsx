import { CountPriceGroup } from './count-price-group'
import { LegalGroup } from './legal-group'
import { PhotosGroup } from './photos-group'
import { PickupGroup } from './pickup-group'
import { PromiseGroup } from './promise-group'
import { ShippingGroup } from './shipping-group'
import { SpeciesSizeGroup } from './species-size-group'
import { WaterHealthGroup } from './water-health-group'

import type { PhotoSending } from './use-batch-photos'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

/** What every group may need beside the form itself. */
export interface BatchSetting {
  farm: OwnSeller
  units: UnitSystem
  today: string
  photos: PhotoSending
  /** A version has been approved before: the stock now keeps the count. */
  isOnSale: boolean
}

interface Props {
  stepId: string
  setting: BatchSetting
}

export function BatchGroup({ stepId, setting }: Props) {
  switch (stepId) {
    case 'species-size':
      return <SpeciesSizeGroup units={setting.units} />
    case 'count-price':
      return <CountPriceGroup isOnSale={setting.isOnSale} />
    case 'water-health':
      return <WaterHealthGroup units={setting.units} today={setting.today} />
    case 'legal':
      return <LegalGroup farm={setting.farm} />
    case 'pickup':
      return <PickupGroup farm={setting.farm} today={setting.today} />
    case 'shipping':
      return <ShippingGroup farm={setting.farm} />
    case 'promise':
      return <PromiseGroup />
    case 'photos':
      return <PhotosGroup photos={setting.photos} />
    default:
      return null
  }
}
