import { StyleSheet, View } from 'react-native'

import { controlStyles } from './control-look'
import { FieldFrame, type FieldWords } from './field-frame'
import { Icon } from './icon'
import { webElement } from './web-element'

import { space } from '@/constants/theme'

import type { Choice } from './choice'
import type { ChangeEvent } from 'react'

export interface SelectProps<Value extends string> extends FieldWords {
  value: Value | ''
  choices: readonly Choice<Value>[]
  onChange: (value: Value) => void
  /** Shown while nothing is chosen. */
  emptyLabel?: string
  isDisabled?: boolean
}

export function Select<Value extends string>(props: SelectProps<Value>) {
  const { value, choices, onChange, emptyLabel, isDisabled, ...words } = props
  return (
    <FieldFrame {...words}>
      {({ nativeID, ...aria }) => (
        <View>
          {webElement('select', {
            id: nativeID,
            ...aria,
            value,
            disabled: isDisabled,
            onChange: (event: ChangeEvent<HTMLSelectElement>) => {
              const chosen = choices.find((choice) => choice.value === event.target.value)
              if (chosen) onChange(chosen.value)
            },
            style: [
              controlStyles.box,
              styles.select,
              words.error ? controlStyles.refused : null,
              isDisabled ? controlStyles.off : null,
            ],
            children: [
              value === ''
                ? webElement('option', { key: '', value: '', children: emptyLabel ?? 'Choose' })
                : null,
              ...choices.map((choice) =>
                webElement('option', { key: choice.value, value: choice.value, children: choice.label }),
              ),
            ],
          })}
          <View style={styles.arrow}>
            <Icon name="down" sizePx={20} tint="muted" />
          </View>
        </View>
      )}
    </FieldFrame>
  )
}

const styles = StyleSheet.create({
  select: { width: '100%', paddingRight: space.xxl + space.sm },
  arrow: { position: 'absolute', right: space.md, top: 14, pointerEvents: 'none' },
})
