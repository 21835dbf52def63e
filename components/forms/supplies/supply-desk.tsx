import { GoodsContext } from './goods-context'
import { SupplyForm } from './supply-form'

import { useHeldDraft } from '@/components/forms/use-held-draft'

import type * as Goods from './supplies-group'
import type { SupplyKind } from './supply-kind'
import type { OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  kind: SupplyKind
  own: OwnListing
  farm: OwnSeller
  units: UnitSystem
  goods: typeof Goods
}

export function SupplyDesk({ kind, own, farm, units, goods }: Props) {
  const { held, onLoadNewer, onKeepMine } = useHeldDraft(own)
  return (
    <GoodsContext value={goods}>
      <SupplyForm
        key={held.round}
        kind={kind}
        own={held.own}
        opened={held.opened}
        shelved={held.shelved}
        farm={farm}
        units={units}
        onLoadNewer={onLoadNewer}
        onKeepMine={onKeepMine}
      />
    </GoodsContext>
  )
}
