import { BatchForm } from './batch-form'
import { checkStep, stepOfField } from './batch-steps'

import { useHeldDraft } from '@/components/forms/use-held-draft'

import type { OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  own: OwnListing
  farm: OwnSeller
  units: UnitSystem
  /** A field to open with, named by a moderator's question. */
  atField?: string
}

export function BatchDesk({ own, farm, units, atField }: Props) {
  const { held, onLoadNewer, onKeepMine } = useHeldDraft(own)
  const firstStep = atField ? stepOfField(atField) : 0
  return (
    <BatchForm
      key={held.round}
      own={held.own}
      opened={held.opened}
      farm={farm}
      units={units}
      shelved={held.shelved}
      firstStep={firstStep === checkStep ? 0 : firstStep}
      onLoadNewer={onLoadNewer}
      onKeepMine={onKeepMine}
    />
  )
}
