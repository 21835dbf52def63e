import { useController, useFormContext, type FieldPathByValue, type FieldValues } from 'react-hook-form'

import { fieldIdOf } from '@/components/forms/field-id'

// Longer than a press: an error that comes or goes while the pointer is down would move what is being pressed.
const afterPressMs = 200

/** A field of the form around it: its value, its error, and when to look at it again. */
export function useBound<T extends FieldValues, V>(name: FieldPathByValue<T, V>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, V>>({ name })
  const { trigger } = useFormContext<T>()
  const error = fieldState.error?.message
  return {
    fieldId: fieldIdOf(name),
    value: field.value as V,
    error,
    /** A complaint goes while the answer is put right, not only when the field is left. */
    change: (value: V) => {
      field.onChange(value)
      if (error) void trigger(name)
    },
    leave: (then?: () => void) => {
      setTimeout(() => {
        field.onBlur()
        then?.()
      }, afterPressMs)
    },
  }
}
