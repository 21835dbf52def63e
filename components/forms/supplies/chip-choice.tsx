import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { fieldIdOf } from '@/components/forms/field-id'
import { Chip } from '@/components/ui/chip'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type { Choice } from '@/components/ui/choice'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, string>
  label: string
  hint?: string
  choices: readonly Choice<string>[]
  onChosen?: (value: string) => void
}

/** One of a few short choices, all in sight, each one tap. */
export function ChipChoice<T extends FieldValues>({ name, label, hint, choices, onChosen }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, string>>({ name })
  const id = fieldIdOf(name)
  const error = fieldState.error?.message
  return (
    <View
      role="group"
      nativeID={id}
      tabIndex={-1}
      aria-labelledby={`${id}-label`}
      aria-describedby={error ? `${id}-error` : undefined}
      style={styles.field}
    >
      <Text face="strong" nativeID={`${id}-label`}>
        {label}
      </Text>
      {hint ? (
        <Text size="note" tint="muted">
          {hint}
        </Text>
      ) : null}
      <View style={styles.chips}>
        {choices.map(({ value, label: word }) => (
          <Chip
            key={value}
            label={word}
            isSelected={field.value === value}
            onPress={() => {
              field.onChange(value)
              field.onBlur()
              onChosen?.(value)
            }}
          />
        ))}
      </View>
      {error ? <FieldError id={`${id}-error`} error={error} /> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
