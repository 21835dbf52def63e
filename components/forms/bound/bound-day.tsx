import type { FieldPathByValue, FieldValues } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { useBound } from './use-bound'

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
  const { fieldId, value, error, change } = useBound<T, string>(name)
  const Control = isTime ? TimeField : DateField
  return (
    <View style={styles.field}>
      <Control {...words} fieldId={fieldId} value={value} onChange={change} error={error} />
      {quickDay && !value ? (
        <QuickFill answer={quickDay.answer} fieldLabel={words.label} onPress={() => change(quickDay.day)} />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ field: { gap: space.sm } })
