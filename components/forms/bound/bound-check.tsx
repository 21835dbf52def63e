import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'

import { fieldIdOf } from '@/components/forms/field-id'
import { Checkbox } from '@/components/ui/checkbox'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, boolean>
  label: string
  hint?: string
}

export function BoundCheck<T extends FieldValues>({ name, ...words }: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, boolean>>({ name })
  return (
    <Checkbox
      {...words}
      fieldId={fieldIdOf(name)}
      isChecked={field.value}
      onChange={(isChecked) => {
        field.onChange(isChecked)
        field.onBlur()
      }}
      error={fieldState.error?.message}
    />
  )
}
