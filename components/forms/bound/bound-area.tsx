import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { fieldIdOf } from '@/components/forms/field-id'
import { QuickFill } from '@/components/forms/quick-fill'
import { TextArea } from '@/components/ui/text-area'
import { space } from '@/constants/theme'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, string>
  label: string
  hint?: string
  isOptional?: boolean
  rows?: number
  maxLength: number
  placeholder?: string
  /** The usual answer, offered while nothing is typed: "None". */
  quickAnswer?: string
}

export function BoundArea<T extends FieldValues>({ name, quickAnswer, ...words }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, string>>({ name })
  return (
    <View style={styles.field}>
      <TextArea
        {...words}
        fieldId={fieldIdOf(name)}
        value={field.value}
        onChangeText={field.onChange}
        onBlur={field.onBlur}
        error={fieldState.error?.message}
      />
      {quickAnswer && !field.value ? (
        <QuickFill
          answer={quickAnswer}
          fieldLabel={words.label}
          onPress={() => field.onChange(quickAnswer)}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ field: { gap: space.sm } })
