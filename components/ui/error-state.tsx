import { StyleSheet, View } from 'react-native'

import { Button } from './button'
import { Heading } from './heading'
import { Icon } from './icon'
import { Text } from './text'

import { space } from '@/constants/theme'

interface Props {
  /** What happened: "We could not load your orders". */
  title: string
  /** What is safe and what to do. */
  body: string
  onRetry?: () => void
  isRetrying?: boolean
  level?: 2 | 3
}

export function ErrorState({ title, body, onRetry, isRetrying, level = 2 }: Props) {
  return (
    <View role="alert" style={styles.frame}>
      <Icon name="warn" sizePx={36} tint="danger" />
      <Heading level={level} size="lead" style={styles.centre}>
        {title}
      </Heading>
      <Text tint="muted" style={styles.centre}>
        {body}
      </Text>
      {onRetry ? (
        <Button
          kind="secondary"
          label="Try again"
          busyLabel="Trying again"
          isBusy={isRetrying}
          onPress={onRetry}
          style={styles.button}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { alignItems: 'center', gap: space.md, paddingVertical: space.xxl, paddingHorizontal: space.lg },
  centre: { textAlign: 'center', maxWidth: 460 },
  button: { alignSelf: 'center' },
})
