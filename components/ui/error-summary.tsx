import { useEffect, useRef } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'

import { focusElement } from './focus-element'
import { Heading } from './heading'
import { Text } from './text'

import { color, radius, space, touchPx } from '@/constants/theme'

export interface FormError {
  /** The field's fieldId; absent for an error of the whole form. */
  fieldId?: string
  message: string
}

interface Props {
  errors: readonly FormError[]
  /** Counts the tries to send: each one that fails moves the keyboard here. */
  attempt: number
  /** Brings a field into view that is not on this step; the keyboard goes there when it has been drawn. */
  onOpen?: (fieldId: string) => void
}

export function ErrorSummary({ errors, attempt, onOpen }: Props) {
  const box = useRef<View>(null)
  const isShown = errors.length > 0
  useEffect(() => {
    if (isShown && attempt > 0) box.current?.focus()
  }, [attempt, isShown])
  if (!isShown) return null
  return (
    <View ref={box} role="alert" tabIndex={-1} style={styles.box}>
      <Heading level={2} size="lead">
        {errors.length === 1 ? 'One thing needs another look' : `${errors.length} things need another look`}
      </Heading>
      {errors.map(({ fieldId, message }) =>
        fieldId ? (
          <Pressable
            key={`${fieldId} ${message}`}
            role="button"
            onPress={() => {
              onOpen?.(fieldId)
              requestAnimationFrame(() => focusElement(fieldId))
            }}
            style={styles.line}
          >
            <Text tint="danger" style={styles.link}>
              {message}
            </Text>
          </Pressable>
        ) : (
          <View key={message} style={styles.line}>
            <Text tint="danger">{message}</Text>
          </View>
        ),
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  box: {
    borderWidth: 2,
    borderColor: color.danger,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    padding: space.lg,
    gap: space.xs,
  },
  line: { minHeight: touchPx, justifyContent: 'center' },
  link: { textDecorationLine: 'underline' },
})
