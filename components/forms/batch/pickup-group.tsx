import { WindowsEditor } from './windows-editor'

import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { FormGroup } from '@/components/forms/form-group'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'

const places = [
  { value: 'farm-gate', label: 'At my place' },
  { value: 'public-place', label: 'At a public place', hint: 'You agree on it in the order, by daylight.' },
]
const answers = [
  {
    value: 'ask',
    label: 'I answer each request',
    hint: 'You have 48 hours to say yes. The deposit is only taken when you do.',
  },
  {
    value: 'instant',
    label: 'Take orders at once',
    hint: 'The deposit is taken as soon as the buyer pays it.',
  },
]
const balances = [
  {
    value: 'at-handover',
    label: 'When they collect',
    hint: 'On their phone, before you hand over the fish.',
  },
  {
    value: 'before',
    label: '48 hours before',
    hint: 'Unpaid a day later, the order ends and the deposit rule applies.',
  },
]

interface Props {
  farm: OwnSeller
  today: string
}

export function PickupGroup({ farm, today }: Props) {
  return (
    <FormGroup
      groupId="pickup"
      title="Pickup"
      intro={`Buyers see an area near ${farm.publicPlace.label}. Your address and phone are shown to a buyer once their pickup is scheduled.`}
    >
      <BoundChoice<BatchTyping> name="placeKind" label="Where do people collect?" choices={places} />
      <WindowsEditor zone={farm.zone} today={today} />
      <BoundChoice<BatchTyping> name="accept" label="How do you take orders?" choices={answers} />
      <BoundChoice<BatchTyping> name="balanceDue" label="When is the rest paid?" choices={balances} />
    </FormGroup>
  )
}
