import { useState } from 'react'
import { useController } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { useGoods } from './goods-context'

import { fieldIdOf } from '@/components/forms/field-id'
import { Chip } from '@/components/ui/chip'
import { Combobox } from '@/components/ui/combobox'
import { space } from '@/constants/theme'

import type { ProduceTyping } from './supply-typing'

interface Props {
  onChosen: (cropId: string) => void
}

/** Picks a crop from the list; the usual ones are one tap. Typing something else takes the choice back. */
export function CropPicker({ onChosen }: Props) {
  const { findCrop, cropChoices, usualCrops, whyNoCrop } = useGoods()
  const { field, fieldState } = useController<ProduceTyping, 'cropId'>({ name: 'cropId' })
  const chosen = findCrop(field.value)
  const [text, setText] = useState(chosen?.name ?? '')
  const isChosen = chosen !== null && chosen.name === text
  const choices = cropChoices(text).map(({ id, name, alsoCalled }) => ({
    id,
    label: name,
    detail: alsoCalled.length > 0 ? alsoCalled.join(', ') : undefined,
  }))
  function choose(id: string, label: string) {
    setText(label)
    field.onChange(id)
    field.onBlur()
    onChosen(id)
  }
  return (
    <View style={styles.field}>
      <Combobox
        label="Crop"
        hint="Any name you use, then pick it from the list."
        fieldId={fieldIdOf('cropId')}
        error={fieldState.error?.message}
        text={text}
        onChangeText={(typed) => {
          setText(typed)
          if (field.value) field.onChange('')
        }}
        choices={isChosen ? [] : choices}
        onChoose={({ id, label }) => choose(id, label)}
        emptyText={isChosen ? undefined : whyNoCrop(text)}
        placeholder="e.g. Butter lettuce"
      />
      {text === '' ? (
        <View role="group" aria-label="Usual crops" style={styles.chips}>
          {usualCrops().map(({ id, name }) => (
            <Chip key={id} label={name} isSelected={false} onPress={() => choose(id, name)} />
          ))}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
