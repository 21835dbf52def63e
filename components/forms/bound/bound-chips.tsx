import type { ReactNode } from 'react'
import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { fieldIdOf } from '@/components/forms/field-id'
import { Chip } from '@/components/ui/chip'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type { Choice } from '@/components/ui/choice'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, string[]>
  label: string
  choices: readonly Choice<string>[]
  /** Stands below the chips. */
  children?: ReactNode
}

/** Some of a few choices, each a chip of its own. A choice made earlier that is no longer offered can be taken off. */
export function BoundChips<T extends FieldValues>({ name, label, choices, children }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, string[]>>({ name })
  const chosen: string[] = field.value
  const id = fieldIdOf(name)
  const error = fieldState.error?.message
  const gone = chosen.filter((one) => !choices.some(({ value }) => value === one))
  const offered = [...choices, ...gone.map((value) => ({ value, label: value }))]
  const toggle = (value: string) => {
    // In the order offered, whatever was pressed first.
    const isOn = chosen.includes(value)
    field.onChange(
      offered.map((one) => one.value).filter((one) => (one === value ? !isOn : chosen.includes(one))),
    )
    field.onBlur()
  }
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
      <View style={styles.chips}>
        {offered.map((one) => (
          <Chip
            key={one.value}
            label={one.label}
            isSelected={chosen.includes(one.value)}
            onPress={() => toggle(one.value)}
          />
        ))}
      </View>
      {error ? <FieldError id={`${id}-error`} error={error} /> : null}
      {children}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
