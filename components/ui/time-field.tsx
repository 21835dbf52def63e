import { controlStyles } from './control-look'
import { FieldFrame, type FieldWords } from './field-frame'
import { webElement } from './web-element'

import type { ChangeEvent } from 'react'

export interface TimeFieldProps extends FieldWords {
  /** 24-hour wall clock of the place, "09:30", or "". */
  value: string
  onChange: (time: string) => void
  stepMinutes?: number
  isDisabled?: boolean
}

export function TimeField({ value, onChange, stepMinutes = 15, isDisabled, ...words }: TimeFieldProps) {
  return (
    <FieldFrame {...words}>
      {({ nativeID, ...aria }) =>
        webElement('input', {
          type: 'time',
          id: nativeID,
          ...aria,
          value,
          step: stepMinutes * 60,
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
