import type { FieldPathByValue, FieldValues } from 'react-hook-form'

import { useBound } from './use-bound'

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

export function BoundText<T extends FieldValues>({
  name,
  isFigure,
  onLeave,
  placeholder,
  ...words
}: Props<T>) {
  const { fieldId, value, error, change, leave } = useBound<T, string>(name)
  const Control = isFigure ? NumberField : Field
  return (
    <Control
      {...words}
      // Said as an example, so that nobody takes it for something already filled in.
      placeholder={placeholder && `e.g. ${placeholder}`}
      fieldId={fieldId}
      value={value}
      onChangeText={change}
      onBlur={() => leave(onLeave)}
      error={error}
    />
  )
}
