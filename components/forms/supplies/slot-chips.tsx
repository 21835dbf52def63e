import { useState } from 'react'
import { useFieldArray, useFormContext, useFormState, useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { isSameSlot, slotChoices } from './slot-choices'

import { WindowsEditor } from '@/components/forms/batch/windows-editor'
import { fieldIdOf } from '@/components/forms/field-id'
import { Chip } from '@/components/ui/chip'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { zoneWords } from '@/shared/times/zone-words'

import type { SupplySetting } from './supply-setting'
import type { SupplyTyping } from './supply-typing'
import type { WindowTyping } from '@/components/forms/batch/batch-typing'

/** When people come: the usual slots in one tap each, any other in the editor below. */
export function SlotChips({ farm, today, now }: SupplySetting) {
  const { trigger, getFieldState } = useFormContext<SupplyTyping>()
  const { append, remove } = useFieldArray<SupplyTyping, 'windows'>({ name: 'windows' })
  const windows = useWatch<SupplyTyping, 'windows'>({ name: 'windows' })
  const { errors } = useFormState<SupplyTyping>({ name: 'windows' })
  const choices = slotChoices(today, now)
  const isUsual = (window: WindowTyping) => choices.some((choice) => isSameSlot(choice.window, window))
  const [isOther, setIsOther] = useState(() => windows.some((window) => !isUsual(window)))
  const id = fieldIdOf('windows')
  const rowFaults = Object.values(errors.windows ?? {}).some((row) => typeof row === 'object' && 'day' in row)
  function toggle(window: WindowTyping) {
    const at = windows.findIndex((one) => isSameSlot(one, window))
    if (at === -1) append(window, { shouldFocus: false })
    else remove(at)
    if (getFieldState('windows').invalid) void trigger('windows')
  }
  if (isOther || rowFaults) return <WindowsEditor zone={farm.zone} today={today} />
  return (
    <View role="group" aria-labelledby={`${id}-label`} nativeID={id} tabIndex={-1} style={styles.field}>
      <View>
        <Text face="strong" nativeID={`${id}-label`}>
          When can people collect?
        </Text>
        <Text size="note" tint="muted">
          {`${zoneWords(farm.zone)}, the clock at your place. Ten buyers a slot.`}
        </Text>
      </View>
      <View style={styles.chips}>
        {choices.map(({ label, window }) => (
          <Chip
            key={label}
            label={label}
            isSelected={windows.some((one) => isSameSlot(one, window))}
            onPress={() => toggle(window)}
          />
        ))}
        <Chip label="Other" isSelected={false} onPress={() => setIsOther(true)} />
      </View>
      {errors.windows?.root?.message ? (
        <FieldError id={`${id}-error`} error={errors.windows.root.message} />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
