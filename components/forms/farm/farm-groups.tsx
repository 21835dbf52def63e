import { useFormContext, useWatch } from 'react-hook-form'

import { LicenceAnswers } from './licence-answers'

import { BoundArea } from '@/components/forms/bound/bound-area'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { stateFacts } from '@/shared/domain/rules/us-states.facts'

import type { FarmTyping } from './farm-typing'

const kinds = [
  { value: 'hatchery', label: 'Hatchery', hint: 'You raise fish, crayfish or prawns to sell alive.' },
  { value: 'grower', label: 'Grower', hint: 'You sell greens, worms or media, perhaps some spare fish.' },
]
const states = stateFacts
  .filter((state) => state.takesAnimals)
  .map(({ code, name }) => ({ value: code, label: name }))

export function FarmGroups() {
  const form = useFormContext<FarmTyping>()
  const ownState = useWatch<FarmTyping, 'state'>({ name: 'state' })
  // The licence question of the farm's own state comes by itself, and follows when another state is chosen.
  function followState(code: string) {
    const licences = form.getValues('licences')
    const others = licences.filter(
      (licence) => licence.state !== code && (licence.state !== ownState || licence.answer),
    )
    const own = licences.find((licence) => licence.state === code) ?? { state: code, answer: '', number: '' }
    form.setValue('licences', [own, ...others], { shouldDirty: true })
  }
  return (
    <>
      <FormGroup groupId="farm" title="Name and kind">
        <BoundText<FarmTyping> name="farmName" label="Name" placeholder="Millrace Hatchery" maxLength={80} />
        <BoundChoice<FarmTyping> name="kind" label="What are you?" choices={kinds} />
        <BoundArea<FarmTyping>
          name="about"
          label="About"
          hint="What you raise, since when, how. Buyers read it beside your listings."
          isOptional
          rows={3}
          maxLength={1200}
        />
      </FormGroup>
      <FormGroup
        groupId="place"
        title="Place"
        intro="Where people collect. Buyers see only an area of a few miles; street and phone are shown to a buyer once their pickup is scheduled."
      >
        <BoundText<FarmTyping>
          name="street"
          label="Street and number"
          maxLength={120}
          autoComplete="street-address"
        />
        <BoundText<FarmTyping> name="city" label="Town" maxLength={64} autoComplete="address-line2" />
        <FieldRow>
          <FieldCell>
            <BoundChoice<FarmTyping>
              name="state"
              label="State"
              choices={states}
              isFolded
              emptyLabel="Choose"
              onChosen={followState}
            />
          </FieldCell>
          <FieldCell>
            <BoundText<FarmTyping>
              name="zip"
              label="ZIP"
              inputMode="numeric"
              maxLength={5}
              autoComplete="postal-code"
            />
          </FieldCell>
        </FieldRow>
        <BoundText<FarmTyping>
          name="phone"
          label="Phone"
          placeholder="(513) 555-0142"
          inputMode="tel"
          maxLength={24}
          autoComplete="tel"
        />
      </FormGroup>
      <FormGroup
        groupId="licences-group"
        title="Licences"
        intro="States ask different things of people who sell live animals. Your own state first; add each state you want buyers from. Your state agency knows for certain."
      >
        <LicenceAnswers ownState={ownState} />
      </FormGroup>
    </>
  )
}
