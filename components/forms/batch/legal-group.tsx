import { useWatch } from 'react-hook-form'

import { StatesServed } from './states-served'

import { BoundArea } from '@/components/forms/bound/bound-area'
import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { FormGroup } from '@/components/forms/form-group'
import { stateFacts } from '@/shared/domain/rules/us-states.facts'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'

const origins = [
  { value: 'hatched-here', label: 'Hatched here', hint: 'From your own breeders.' },
  { value: 'grown-on', label: 'Grown on here', hint: 'They came as eggs or fry and grew at your place.' },
  { value: 'bought-in', label: 'Bought in', hint: 'They came at about the size you sell them.' },
]
const wildAnswers = [
  { value: 'no', label: 'No, all were raised' },
  { value: 'yes', label: 'Yes, some or all' },
]
const states = stateFacts
  .filter((state) => state.takesAnimals)
  .map(({ code, name }) => ({ value: code, label: name }))

export function LegalGroup({ farm }: { farm: OwnSeller }) {
  const origin = useWatch<BatchTyping, 'origin'>({ name: 'origin' })
  return (
    <FormGroup
      groupId="legal"
      title="Legal"
      intro="Both sides can be asked where animals came from. What you state here is kept with every order."
    >
      <BoundChoice<BatchTyping> name="origin" label="Where do they come from?" choices={origins} />
      {origin === 'bought-in' || origin === 'grown-on' ? (
        <BoundChoice<BatchTyping>
          name="originState"
          label="From which state?"
          choices={states}
          isFolded
          isOptional={origin === 'grown-on'}
          emptyLabel="Choose a state"
        />
      ) : null}
      <BoundChoice<BatchTyping>
        name="wildCaught"
        label="Were any of them caught in the wild?"
        choices={wildAnswers}
      />
      <BoundCheck<BatchTyping>
        name="singleSpeciesChecked"
        label="I have graded and checked this batch: it holds one species"
        hint="One wrong fish in a bag can be a case for you and for the buyer."
      />
      <BoundArea<BatchTyping>
        name="licenceNumbers"
        label="Your licence or permit numbers"
        hint='From your farm page. Where none is needed, write "none needed" and why.'
        rows={2}
        maxLength={300}
      />
      <StatesServed farm={farm} />
    </FormGroup>
  )
}
