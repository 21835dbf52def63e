import { controlStyles } from './control-look'
import { FieldFrame, type FieldWords } from './field-frame'
import { webElement } from './web-element'

import type { ChangeEvent } from 'react'

export interface DateFieldProps extends FieldWords {
  /** ISO calendar day, "2027-01-15", or "". */
  value: string
  onChange: (day: string) => void
  min?: string
  max?: string
  isDisabled?: boolean
}

export function DateField({ value, onChange, min, max, isDisabled, ...words }: DateFieldProps) {
  return (
    <FieldFrame {...words}>
      {({ nativeID, ...aria }) =>
        webElement('input', {
          type: 'date',
          id: nativeID,
          ...aria,
          value,
          min,
          max,
          disabled: isDisabled,
          onChange: (event: ChangeEvent<HTMLInputElement>) => onChange(event.target.value),
          style: [
            controlStyles.box,
            words.error ? controlStyles.refused : null,
            isDisabled ? controlStyles.off : null,
          ],
        })
      }
    </FieldFrame>
  )
}
