import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { fieldIdOf } from '@/components/forms/field-id'
import { QuickFill } from '@/components/forms/quick-fill'
import { DateField } from '@/components/ui/date-field'
import { TimeField } from '@/components/ui/time-field'
import { space } from '@/constants/theme'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, string>
  label: string
  hint?: string
  isOptional?: boolean
  /** A time of day instead of a day. */
  isTime?: boolean
  /** A day offered in one tap while none is chosen. */
  quickDay?: { answer: string; day: string }
}

export function BoundDay<T extends FieldValues>({ name, isTime, quickDay, ...words }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, string>>({ name })
  const Control = isTime ? TimeField : DateField
  return (
    <View style={styles.field}>
      <Control
        {...words}
        fieldId={fieldIdOf(name)}
        value={field.value}
        onChange={field.onChange}
        error={fieldState.error?.message}
      />
      {quickDay && !field.value ? (
        <QuickFill
          answer={quickDay.answer}
          fieldLabel={words.label}
          onPress={() => field.onChange(quickDay.day)}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ field: { gap: space.sm } })
