import { Field } from './field'

import type { FieldWords } from './field-frame'

export interface TimeFieldProps extends FieldWords {
  value: string
  onChange: (time: string) => void
  stepMinutes?: number
  isDisabled?: boolean
}

export function TimeField({ onChange, stepMinutes = 15, hint, ...rest }: TimeFieldProps) {
  const example = `24-hour time in steps of ${stepMinutes} minutes, such as 09:30`
  return <Field {...rest} hint={hint ?? example} onChangeText={onChange} inputMode="numeric" />
}
