import { Field } from './field'

import type { FieldWords } from './field-frame'

export interface DateFieldProps extends FieldWords {
  value: string
  onChange: (day: string) => void
  min?: string
  max?: string
  isDisabled?: boolean
}

export function DateField({ onChange, min, max, hint, ...rest }: DateFieldProps) {
  const range = min && max ? `${min} to ${max}` : (min ?? max ?? '2027-01-15')
  return (
    <Field
      {...rest}
      hint={hint ?? `Year-month-day, such as ${range}`}
      onChangeText={onChange}
      inputMode="numeric"
    />
  )
}
