import { useFormState, useWatch } from 'react-hook-form'

import { ChipChoice } from './chip-choice'
import { Fold } from './fold'
import { LiveNote } from './live-note'

import { BoundArea } from '@/components/forms/bound/bound-area'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FormGroup } from '@/components/forms/form-group'
import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'

import type * as Goods from './supplies-group'
import type { ProduceTyping } from './supply-typing'

const yesNo = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
]
const touches = [
  { value: 'no', label: 'No' },
  { value: 'yes', label: 'Yes' },
  { value: 'not-sure', label: 'Not sure' },
]
const organics = [
  { value: 'certified', label: 'Certified organic' },
  { value: 'exempt-small', label: 'Organic, exempt as a small farm' },
]
const standings = [
  { value: 'not-covered', label: 'Not covered', hint: 'Small produce sales.' },
  {
    value: 'qualified-exempt',
    label: 'Qualified exempt',
    hint: 'Your farm’s name and address become public.',
  },
  { value: 'covered', label: 'Covered' },
  { value: 'unknown', label: 'I don’t know', hint: 'You may sell meanwhile.' },
]
const touchWords: Record<string, string> = {
  no: 'fish water stays off the leaves',
  yes: 'fish water touches the leaves',
  'not-sure': 'not sure whether fish water touches the leaves',
}

/** How the farm works: asked once, remembered for the next harvest. */
export function HandlingGroup({ notes }: { notes: ReturnType<typeof Goods.produceNotes> }) {
  const [handling, growing, standing, organic] = useWatch<
    ProduceTyping,
    ['handling', 'growing', 'standing', 'organic']
  >({ name: ['handling', 'growing', 'standing', 'organic'] })
  const { errors } = useFormState<ProduceTyping>()
  const isOpen =
    !handling.touchesSystemWater ||
    !handling.rinsedInDrinkingWater ||
    !handling.coldAtPickup ||
    !growing ||
    !standing
  const hasFault = Boolean(errors.handling ?? errors.growing ?? errors.standing ?? errors.organicCertifier)
  const summary = [
    touchWords[handling.touchesSystemWater],
    handling.rinsedInDrinkingWater === 'yes' ? 'rinsed in drinking water' : 'not rinsed',
    handling.coldAtPickup === 'yes' ? 'handed over cold' : 'not handed over cold',
    standings.find(({ value }) => value === standing)?.label.toLowerCase(),
  ].filter(Boolean)
  return (
    <FormGroup groupId="handling" title="How you grow and handle it">
      <Fold
        key={String(hasFault)}
        label="how you grow and handle it"
        summary={`As last time: ${summary.join(', ')}.`}
        isOpenFirst={isOpen || hasFault}
      >
        <ChipChoice<ProduceTyping>
          name="handling.touchesSystemWater"
          label="Does fish water touch the part that is eaten?"
          choices={touches}
        />
        <ChipChoice<ProduceTyping>
          name="handling.rinsedInDrinkingWater"
          label="Rinsed in drinking water?"
          choices={yesNo}
        />
        <ChipChoice<ProduceTyping>
          name="handling.coldAtPickup"
          label="Handed over from a cooler or fridge?"
          choices={yesNo}
        />
        <BoundArea<ProduceTyping>
          name="growing"
          label="How do you grow it?"
          rows={2}
          maxLength={400}
          placeholder="On rafts, in fish water, without synthetic pesticides."
        />
        <LiveNote words={errors.growing ? null : notes.words.growing} tone="caution" />
        <BoundChoice<ProduceTyping>
          name="organic"
          label="“Organic”"
          choices={organics}
          isFolded
          emptyLabel="No claim"
        />
        {organic === 'certified' ? (
          <BoundText<ProduceTyping> name="organicCertifier" label="Who certified you?" maxLength={120} />
        ) : null}
        <BoundChoice<ProduceTyping>
          name="standing"
          label="Your farm under the produce safety rule"
          choices={standings}
        />
      </Fold>
      {notes.shows ? (
        <Banner tone="caution" title="Your address becomes public" isLive>
          <Text size="note">{`Listing, label and receipt show: ${notes.shows}.`}</Text>
        </Banner>
      ) : null}
      <LiveNote words={standing === 'qualified-exempt' ? null : isOpen ? notes.standing : null} />
    </FormGroup>
  )
}
