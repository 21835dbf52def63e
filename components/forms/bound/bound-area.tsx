import type { FieldPathByValue, FieldValues } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { useBound } from './use-bound'

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
  const { fieldId, value, error, change, leave } = useBound<T, string>(name)
  return (
    <View style={styles.field}>
      <TextArea
        {...words}
        fieldId={fieldId}
        value={value}
        onChangeText={change}
        onBlur={() => leave()}
        error={error}
      />
      {quickAnswer && !value ? (
        <QuickFill answer={quickAnswer} fieldLabel={words.label} onPress={() => change(quickAnswer)} />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ field: { gap: space.sm } })
