import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Heading } from './heading'
import { Icon } from './icon'
import { Text } from './text'

import { color, radius, space } from '@/constants/theme'

import type { IconName } from './icon-paths'

interface Props {
  title: string
  /** What to do next, in a sentence. */
  body: string
  icon?: IconName
  action?: ReactNode
  level?: 2 | 3
}

export function EmptyState({ title, body, icon = 'fish', action, level = 2 }: Props) {
  return (
    <View style={styles.frame}>
      <View style={styles.ring}>
        <Icon name={icon} sizePx={32} tint="muted" />
      </View>
      <Heading level={level} size="lead" style={styles.centre}>
        {title}
      </Heading>
      <Text tint="muted" style={styles.centre}>
        {body}
      </Text>
      {action ? <View>{action}</View> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { alignItems: 'center', gap: space.md, paddingVertical: space.xxl, paddingHorizontal: space.lg },
  ring: {
    width: 72,
    height: 72,
    borderRadius: radius.full,
    borderWidth: 2,
    borderStyle: 'dashed',
    borderColor: color.edge,
    alignItems: 'center',
    justifyContent: 'center',
  },
  centre: { textAlign: 'center', maxWidth: 460 },
})
