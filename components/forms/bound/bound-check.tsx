import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'

import { fieldIdOf } from '@/components/forms/field-id'
import { Checkbox } from '@/components/ui/checkbox'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, boolean>
  label: string
  hint?: string
  /** Told after the form has taken the answer. */
  onChosen?: () => void
}

export function BoundCheck<T extends FieldValues>({ name, onChosen, ...words }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, boolean>>({ name })
  return (
    <Checkbox
      {...words}
      fieldId={fieldIdOf(name)}
      isChecked={field.value}
      onChange={(isChecked) => {
        field.onChange(isChecked)
        field.onBlur()
        onChosen?.()
      }}
      error={fieldState.error?.message}
    />
  )
}
