import { useController, type FieldPathByValue, type FieldValues } from 'react-hook-form'

import { fieldIdOf } from '@/components/forms/field-id'
import { RadioGroup } from '@/components/ui/radio-group'
import { Select } from '@/components/ui/select'

import type { Choice } from '@/components/ui/choice'

interface Props<T extends FieldValues> {
  name: FieldPathByValue<T, string>
  label: string
  choices: readonly Choice<string>[]
  hint?: string
  isOptional?: boolean
  /** A list that unfolds instead of dots: for choices that need no explanation. */
  isFolded?: boolean
  emptyLabel?: string
  /** Told before the form takes the choice. */
  onChosen?: (value: string) => void
}

export function BoundChoice<T extends FieldValues>({
  name,
  isFolded,
  emptyLabel,
  onChosen,
  ...words
}: Props<T>) {
  const { field, fieldState } = useController<T, FieldPathByValue<T, string>>({ name })
  const control = {
    ...words,
    fieldId: fieldIdOf(name),
    value: field.value as string,
    error: fieldState.error?.message,
    onChange: (value: string) => {
      onChosen?.(value)
      field.onChange(value)
      field.onBlur()
    },
  }
  return isFolded ? <Select {...control} emptyLabel={emptyLabel} /> : <RadioGroup {...control} />
}
