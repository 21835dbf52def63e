import { useWatch } from 'react-hook-form'
import { View } from 'react-native'

import { previewFacts } from './preview-facts'

import { Tag } from '@/components/listings/tag'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  farm: OwnSeller
  units: UnitSystem
}

/** The real tag, growing with what is typed. */
export function PreviewTag({ farm, units }: Props) {
  const typing = useWatch<BatchTyping>() as BatchTyping
  return (
    <View role="group" aria-label="How buyers will see it">
      <Tag size="card" facts={previewFacts(typing, { units, placeText: farm.publicPlace.label })} />
    </View>
  )
}
