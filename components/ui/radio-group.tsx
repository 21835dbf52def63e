import { useId, useRef } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'

import { CheckMark } from './check-mark'
import { FieldError, type FieldWords } from './field-frame'
import { Text } from './text'

import { space, touchPx } from '@/constants/theme'

import type { Choice } from './choice'

interface Props<Value extends string> extends FieldWords {
  value: Value | ''
  choices: readonly Choice<Value>[]
  onChange: (value: Value) => void
  isDisabled?: boolean
}

export function RadioGroup<Value extends string>(props: Props<Value>) {
  const { label, hint, error, isOptional, choices, value } = props
  const madeUp = useId()
  const id = props.fieldId ?? madeUp
  const dots = useRef(new Map<Value, View>())
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ')

  function step(from: number, by: number) {
    const next = choices[(from + by + choices.length) % choices.length]
    if (!next || props.isDisabled) return
    props.onChange(next.value)
    dots.current.get(next.value)?.focus()
  }

  return (
    <View style={styles.frame}>
      <Text face="strong" nativeID={`${id}-label`}>
        {isOptional ? `${label} (optional)` : label}
      </Text>
      {hint ? (
        <Text size="note" tint="muted" nativeID={`${id}-hint`}>
          {hint}
        </Text>
      ) : null}
      <View
        role="radiogroup"
        nativeID={id}
        tabIndex={-1}
        aria-labelledby={`${id}-label`}
        aria-describedby={described || undefined}
        aria-invalid={Boolean(error)}
      >
        {choices.map((choice, index) => (
          <Radio
            key={choice.value}
            choice={choice}
            isOn={choice.value === value}
            isReached={choice.value === value || (value === '' && index === 0)}
            isDisabled={props.isDisabled}
            onChoose={() => props.onChange(choice.value)}
            onStep={(by) => step(index, by)}
            hold={(view) => {
              if (view) dots.current.set(choice.value, view)
              else dots.current.delete(choice.value)
            }}
          />
        ))}
      </View>
      {error ? <FieldError id={`${id}-error`} error={error} /> : null}
    </View>
  )
}

const steps: Record<string, number> = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 }

interface RadioProps<Value extends string> {
  choice: Choice<Value>
  isOn: boolean
  /** Roving focus: one stop for Tab in a group. */
  isReached: boolean
  isDisabled?: boolean
  onChoose: () => void
  onStep: (by: number) => void
  hold: (view: View | null) => void
}

function Radio<Value extends string>({
  choice,
  isOn,
  isReached,
  isDisabled,
  onChoose,
  onStep,
  hold,
}: RadioProps<Value>) {
  return (
    <Pressable
      ref={hold}
      role="radio"
      aria-checked={isOn}
      disabled={isDisabled}
      tabIndex={isReached ? 0 : -1}
      onPress={onChoose}
      onKeyDown={(event) => {
        const { key } = event.nativeEvent
        const by = steps[key]
        if (by === undefined && key !== ' ') return
        event.preventDefault()
        if (by === undefined) onChoose()
        else onStep(by)
      }}
      style={styles.row}
    >
      <CheckMark shape="dot" isOn={isOn} />
      <View style={styles.words}>
        <Text tint={isDisabled ? 'muted' : 'ink'}>{choice.label}</Text>
        {choice.hint ? (
          <Text size="note" tint="muted">
            {choice.hint}
          </Text>
        ) : null}
      </View>
    </Pressable>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xs },
  row: {
    flexDirection: 'row',
    gap: space.md,
    minHeight: touchPx,
    alignItems: 'flex-start',
    paddingVertical: 10,
  },
  words: { flex: 1 },
})
