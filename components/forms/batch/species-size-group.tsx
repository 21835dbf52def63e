import { useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { LengthField } from './length-field'
import { SpeciesPicker } from './species-picker'
import { StageNote } from './stage-note'

import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundDay } from '@/components/forms/bound/bound-day'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { space } from '@/constants/theme'
import { stages } from '@/shared/domain/species/stages.facts'

import type { BatchTyping } from './batch-typing'
import type { UnitSystem } from '@/shared/units/unit-system'

const stageChoices = stages.map(({ id, name }) => ({ value: id, label: name }))
const sexChoices = [
  { value: 'mixed', label: 'Mixed' },
  { value: 'all-male', label: 'All male' },
  { value: 'unknown', label: 'Not known' },
]

export function SpeciesSizeGroup({ units }: { units: UnitSystem }) {
  const sex = useWatch<BatchTyping, 'sex'>({ name: 'sex' })
  return (
    <FormGroup groupId="species-size" title="Species and size">
      <SpeciesPicker />
      <BoundText<BatchTyping> name="strain" label="Strain or line" isOptional maxLength={80} />
      <FieldRow>
        <FieldCell>
          <LengthField
            name="sizeLoMm"
            label="Shortest"
            placeholder={units === 'us' ? '2 1/4 in' : '6 cm'}
            units={units}
          />
        </FieldCell>
        <FieldCell>
          <LengthField
            name="sizeHiMm"
            label="Longest"
            placeholder={units === 'us' ? '3 in' : '7.5 cm'}
            units={units}
          />
        </FieldCell>
      </FieldRow>
      <View style={styles.field}>
        <BoundChoice<BatchTyping>
          name="stage"
          label="Stage"
          choices={stageChoices}
          isFolded
          emptyLabel="Choose a stage"
        />
        <StageNote />
      </View>
      <BoundCheck<BatchTyping>
        name="ungraded"
        label="Ungraded"
        hint="Tick it when more than 2 inches lie between the shortest and the longest."
      />
      <FieldRow>
        <FieldCell>
          <BoundDay<BatchTyping> name="hatchedOn" label="Hatched on" hint="About is fine." />
        </FieldCell>
        <FieldCell>
          <BoundDay<BatchTyping> name="readyOn" label="Ready from" hint="If they still grow." isOptional />
        </FieldCell>
      </FieldRow>
      <FieldRow>
        <FieldCell>
          <BoundChoice<BatchTyping> name="sex" label="Sex" choices={sexChoices} isFolded />
        </FieldCell>
        <FieldCell>
          {sex === 'all-male' ? (
            <BoundText<BatchTyping>
              name="sexClaimPct"
              label="Males you promise"
              placeholder="95 %"
              isOptional
              isFigure
            />
          ) : null}
        </FieldCell>
      </FieldRow>
    </FormGroup>
  )
}

const styles = StyleSheet.create({ field: { gap: space.xs } })
