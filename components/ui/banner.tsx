import type { ReactNode } from 'react'
import { StyleSheet, View, type ViewStyle } from 'react-native'

import { Icon } from './icon'
import { Text } from './text'
import { toneIcon, toneTint } from './tone'

import { color, radius, space, type Tone } from '@/constants/theme'

import type { IconName } from './icon-paths'

interface Props {
  tone: Exclude<Tone, 'neutral' | 'today'>
  /** The verdict in words: "Too cold to ship". */
  title: string
  children?: ReactNode
  icon?: IconName
  /** Read out when it appears; leave off for what stands there from the start. */
  isLive?: boolean
}

export function Banner({ tone, title, children, icon, isLive }: Props) {
  const tint = toneTint[tone]
  return (
    <View role={isLive ? (tone === 'danger' ? 'alert' : 'status') : 'note'} style={styles.banner}>
      <View style={[styles.edge, { backgroundColor: color[tint] }, edgePattern[tone]]} />
      <View style={styles.icon}>
        <Icon name={icon ?? toneIcon[tone]} tint={tint} />
      </View>
      <View style={styles.words}>
        <Text face="strong" tint={tint}>
          {title}
        </Text>
        {typeof children === 'string' ? <Text size="note">{children}</Text> : children}
      </View>
    </View>
  )
}

// The weather tones wear their pattern on the edge too.
const dots = `radial-gradient(circle, ${color.card} 1.2px, transparent 1.6px)`
const slants = `repeating-linear-gradient(45deg, ${color.card} 0 2px, transparent 2px 6px)`
const edgePattern: Partial<Record<Tone, ViewStyle>> = {
  cold: { backgroundImage: dots, backgroundSize: '6px 6px' },
  hot: { backgroundImage: slants },
}

const styles = StyleSheet.create({
  banner: {
    flexDirection: 'row',
    backgroundColor: color.card,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
    overflow: 'hidden',
  },
  edge: { width: 8 },
  icon: { paddingTop: space.md, paddingLeft: space.md },
  words: { flex: 1, padding: space.md, gap: space.xs },
})
