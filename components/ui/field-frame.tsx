import { useId, type ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Icon } from './icon'
import { Label } from './label'
import { Text } from './text'

import { space } from '@/constants/theme'

export interface FieldWords {
  label: string
  hint?: string
  error?: string
  isOptional?: boolean
  /** The id an error summary jumps to; made up when absent. */
  fieldId?: string
}

export interface ControlProps {
  nativeID: string
  'aria-labelledby': string
  'aria-describedby': string | undefined
  'aria-invalid': boolean
}

interface Props extends FieldWords {
  children: (control: ControlProps) => ReactNode
}

export function FieldFrame({ label, hint, error, isOptional, fieldId, children }: Props) {
  const madeUp = useId()
  const id = fieldId ?? madeUp
  const labelId = `${id}-label`
  const hintId = `${id}-hint`
  const errorId = `${id}-error`
  const described = [hint ? hintId : '', error ? errorId : ''].filter(Boolean).join(' ')
  return (
    <View style={styles.frame}>
      <Label text={label} controlId={id} labelId={labelId} note={isOptional ? 'optional' : undefined} />
      {hint ? (
        <Text size="note" tint="muted" nativeID={hintId}>
          {hint}
        </Text>
      ) : null}
      {children({
        nativeID: id,
        'aria-labelledby': labelId,
        'aria-describedby': described || undefined,
        'aria-invalid': Boolean(error),
      })}
      {error ? <FieldError id={errorId} error={error} /> : null}
    </View>
  )
}

export function FieldError({ id, error }: { id: string; error: string }) {
  return (
    <View role="alert" style={styles.error}>
      <Icon name="stop" sizePx={18} tint="danger" />
      <Text size="note" face="strong" tint="danger" nativeID={id} style={styles.words}>
        {error}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xs, alignSelf: 'stretch' },
  error: { flexDirection: 'row', gap: space.xs, alignItems: 'flex-start' },
  words: { flexShrink: 1 },
})
