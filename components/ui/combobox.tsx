import { useState } from 'react'
import { TextInput, View, type NativeSyntheticEvent, type TextInputKeyPressEventData } from 'react-native'

import { controlStyles } from './control-look'
import { FieldFrame, type FieldWords } from './field-frame'
import { HiddenText } from './hidden-text'
import { Listbox, Option } from './listbox'
import { Text } from './text'

import { color } from '@/constants/theme'

export interface ComboboxChoice {
  id: string
  label: string
  /** A second line: state and county, scientific name. */
  detail?: string
}

interface Props extends FieldWords {
  text: string
  onChangeText: (text: string) => void
  /** Already filtered by the caller, who may fetch them. */
  choices: readonly ComboboxChoice[]
  onChoose: (choice: ComboboxChoice) => void
  isLoading?: boolean
  /** Said when nothing fits: "No place by that name". */
  emptyText?: string
  placeholder?: string
  autoComplete?: 'off' | 'postal-code'
  onSubmit?: () => void
}

type KeyPress = NativeSyntheticEvent<TextInputKeyPressEventData>

export function Combobox({ text, onChangeText, choices, onChoose, isLoading, emptyText, ...rest }: Props) {
  const { placeholder, autoComplete = 'off', onSubmit, ...words } = rest
  const [isOpen, setIsOpen] = useState(false)
  const [active, setActive] = useState(-1)
  const hasAnswer = choices.length > 0 || (Boolean(emptyText) && !isLoading)
  const isShown = isOpen && text.trim() !== '' && hasAnswer

  function close() {
    setIsOpen(false)
    setActive(-1)
  }
  function choose(choice: ComboboxChoice | undefined) {
    if (!choice) return
    onChoose(choice)
    close()
  }
  function onKeyPress(event: KeyPress) {
    const key = event.nativeEvent.key
    if (key === 'ArrowDown' || key === 'ArrowUp') {
      event.preventDefault()
      setIsOpen(true)
      setActive(nextActive({ active, count: choices.length, by: key === 'ArrowDown' ? 1 : -1 }))
    } else if (key === 'Enter') {
      if (isShown && active >= 0) {
        event.preventDefault()
        choose(choices[active])
      } else onSubmit?.()
    } else if (key === 'Escape' && isShown) {
      event.stopPropagation()
      close()
    }
  }

  return (
    <FieldFrame {...words}>
      {(control) => {
        const listId = `${control.nativeID}-list`
        const optionId = (choice: ComboboxChoice) => `${control.nativeID}-${choice.id}`
        const activeChoice = isShown ? choices[active] : undefined
        return (
          <View>
            <TextInput
              {...control}
              role="combobox"
              aria-expanded={isShown}
              aria-controls={isShown ? listId : undefined}
              aria-autocomplete="list"
              aria-activedescendant={activeChoice ? optionId(activeChoice) : undefined}
              aria-busy={isLoading}
              value={text}
              onChangeText={(typed) => {
                onChangeText(typed)
                setIsOpen(true)
                setActive(-1)
              }}
              onKeyPress={onKeyPress}
              onBlur={close}
              placeholder={placeholder}
              placeholderTextColor={color.muted}
              autoComplete={autoComplete}
              autoCapitalize="words"
              spellCheck={false}
              style={[controlStyles.box, words.error ? controlStyles.refused : null]}
            />
            {isShown && choices.length > 0 ? (
              <Listbox nativeID={listId} label={words.label}>
                {choices.map((choice, index) => (
                  <Option
                    key={choice.id}
                    nativeID={optionId(choice)}
                    isActive={index === active}
                    onChoose={() => choose(choice)}
                  >
                    <Text>{choice.label}</Text>
                    {choice.detail ? (
                      <Text size="small" tint="muted">
                        {choice.detail}
                      </Text>
                    ) : null}
                  </Option>
                ))}
              </Listbox>
            ) : null}
            {isShown && choices.length === 0 ? (
              <Text size="note" tint="muted">
                {emptyText}
              </Text>
            ) : null}
            <HiddenText isLive>{isShown ? countText(choices.length, emptyText) : ''}</HiddenText>
          </View>
        )
      }}
    </FieldFrame>
  )
}

function nextActive({ active, count, by }: { active: number; count: number; by: 1 | -1 }): number {
  if (count === 0) return -1
  if (active < 0) return by === 1 ? 0 : count - 1
  return (active + by + count) % count
}

function countText(count: number, emptyText?: string): string {
  if (count === 0) return emptyText ?? ''
  return count === 1 ? '1 suggestion' : `${count} suggestions`
}
