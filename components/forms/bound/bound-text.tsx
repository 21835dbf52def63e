import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'

import { fieldIdOf } from '@/components/forms/field-id'
import { Field, type FieldProps } from '@/components/ui/field'
import { NumberField } from '@/components/ui/number-field'

type Words = Omit<FieldProps, 'value' | 'onChangeText' | 'onBlur' | 'error' | 'fieldId'>

interface Props<T extends FieldValues> extends Words {
  name: FieldPathByValue<T, string>
  /** Free text that is read as a figure: "2 1/4 in", "72 F", "2,000". */
  isFigure?: boolean
  /** Told after the keyboard has left the field. */
  onLeave?: () => void
}

export function BoundText<T extends FieldValues>({ name, isFigure, onLeave, ...words }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, string>>({ name })
  const Control = isFigure ? NumberField : Field
  return (
    <Control
      {...words}
      fieldId={fieldIdOf(name)}
      value={field.value}
      onChangeText={field.onChange}
      onBlur={() => {
        field.onBlur()
        onLeave?.()
      }}
      error={fieldState.error?.message}
    />
  )
}
