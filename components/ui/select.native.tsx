import { View } from 'react-native'

import { RadioGroup } from './radio-group'

import type { Choice } from './choice'
import type { FieldWords } from './field-frame'

export interface SelectProps<Value extends string> extends FieldWords {
  value: Value | ''
  choices: readonly Choice<Value>[]
  onChange: (value: Value) => void
  emptyLabel?: string
  isDisabled?: boolean
}

// React Native has no picker of its own; a list of radios is plain and reachable.
export function Select<Value extends string>({ emptyLabel, ...rest }: SelectProps<Value>) {
  return (
    <View aria-label={emptyLabel}>
      <RadioGroup {...rest} />
    </View>
  )
}
