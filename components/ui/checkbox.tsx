import { useId } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'

import { CheckMark } from './check-mark'
import { FieldError } from './field-frame'
import { onSpace } from './on-space'
import { Text } from './text'

import { space, touchPx } from '@/constants/theme'

interface Props {
  label: string
  isChecked: boolean
  onChange: (isChecked: boolean) => void
  hint?: string
  error?: string
  fieldId?: string
  isDisabled?: boolean
}

export function Checkbox({ label, isChecked, onChange, hint, error, fieldId, isDisabled }: Props) {
  const madeUp = useId()
  const id = fieldId ?? madeUp
  const errorId = `${id}-error`
  const hintId = `${id}-hint`
  const described = [hint ? hintId : '', error ? errorId : ''].filter(Boolean).join(' ')
  return (
    <View style={styles.frame}>
      <Pressable
        role="checkbox"
        nativeID={id}
        aria-checked={isChecked}
        aria-labelledby={`${id}-label`}
        aria-describedby={described || undefined}
        aria-invalid={Boolean(error)}
        disabled={isDisabled}
        onPress={() => onChange(!isChecked)}
        onKeyDown={isDisabled ? undefined : onSpace(() => onChange(!isChecked))}
        style={styles.row}
      >
        <CheckMark shape="box" isOn={isChecked} isRefused={Boolean(error)} />
        <View style={styles.words}>
          <Text nativeID={`${id}-label`} tint={isDisabled ? 'muted' : 'ink'}>
            {label}
          </Text>
          {hint ? (
            <Text size="note" tint="muted" nativeID={hintId}>
              {hint}
            </Text>
          ) : null}
        </View>
      </Pressable>
      {error ? <FieldError id={errorId} error={error} /> : null}
    </View>
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
