import { useState } from 'react'
import { useFormContext, useFormState, useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { LiveNote } from './live-note'

import { BoundDay } from '@/components/forms/bound/bound-day'
import { BoundText } from '@/components/forms/bound/bound-text'
import { fieldIdOf } from '@/components/forms/field-id'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'
import { printDay, printTime } from '@/components/forms/day-text'
import { Chip } from '@/components/ui/chip'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type * as Goods from './supplies-group'
import type { SupplySetting } from './supply-setting'
import type { ProduceTyping } from './supply-typing'

const morning = '07:00'

interface Props {
  setting: SupplySetting
  notes: ReturnType<typeof Goods.produceNotes>
}

/** When it was cut and how it is kept: the last day of sale follows from it. */
export function HarvestGroup({ setting, notes }: Props) {
  const sellBy = notes.sellByDay
    ? `Sold until ${printDay(notes.sellByDay)}, kept like this. It ends by itself after that day.`
    : null
  return (
    <FormGroup groupId="harvest" title="Harvest">
      <HarvestWhen {...setting} />
      <FieldRow>
        <FieldCell>
          <BoundText<ProduceTyping>
            name="handling.heldC"
            label="Kept at"
            placeholder={setting.units === 'us' ? '38 F' : '3 C'}
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<ProduceTyping>
            name="harvest.bed"
            label="Bed or raft"
            placeholder="bed 3"
            isOptional
            maxLength={20}
          />
        </FieldCell>
      </FieldRow>
      <LiveNote words={sellBy} />
      {notes.mustSaySellBy ? (
        <BoundDay<ProduceTyping>
          name="sellBy"
          label="Sold until"
          hint="Nobody published how long it keeps like this, so you say it."
        />
      ) : null}
      {notes.advice.map((sentence) => (
        <LiveNote key={sentence} words={sentence} tone="caution" />
      ))}
      <LiveNote
        words={
          notes.lotCode ? `Lot code ${notes.lotCode}, or the next free one: write it on every box.` : null
        }
      />
    </FormGroup>
  )
}

function HarvestWhen({ today, now }: SupplySetting) {
  const form = useFormContext<ProduceTyping>()
  const harvest = useWatch<ProduceTyping, 'harvest'>({ name: 'harvest' })
  const { errors } = useFormState<ProduceTyping>({ name: 'harvest' })
  const [isPicking, setIsPicking] = useState(false)
  const id = fieldIdOf('harvest.day')
  const isToday = harvest.day === today
  const isMorning = isToday && harvest.time === morning
  const isSet = harvest.day !== '' && harvest.time !== ''
  const fault = errors.harvest?.day?.message ?? errors.harvest?.time?.message
  function set(time: string) {
    setIsPicking(false)
    form.setValue(
      'harvest',
      { ...harvest, day: today, time },
      { shouldDirty: true, shouldValidate: Boolean(fault) },
    )
  }
  return (
    <View
      role="group"
      nativeID={isPicking ? undefined : id}
      tabIndex={-1}
      aria-label="Harvested when"
      style={styles.field}
    >
      <Text face="strong">Harvested when?</Text>
      <View style={styles.chips}>
        <Chip
          label="Now"
          isSelected={!isPicking && isToday && !isMorning && isSet}
          onPress={() => set(now)}
        />
        {now > morning ? (
          <Chip label="This morning" isSelected={!isPicking && isMorning} onPress={() => set(morning)} />
        ) : null}
        <Chip
          label="Pick day and time"
          isSelected={isPicking || (isSet && !isToday)}
          onPress={() => setIsPicking(true)}
        />
      </View>
      {isPicking || (isSet && !isToday) ? (
        <FieldRow>
          <FieldCell>
            <BoundDay<ProduceTyping> name="harvest.day" label="Day" />
          </FieldCell>
          <FieldCell>
            <BoundDay<ProduceTyping> name="harvest.time" label="Time" isTime />
          </FieldCell>
        </FieldRow>
      ) : isSet ? (
        <LiveNote words={`${printDay(harvest.day)}, ${printTime(harvest.time)}.`} />
      ) : fault ? (
        <FieldError id={`${id}-error`} error={fault} />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
