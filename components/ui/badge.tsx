import { StyleSheet, View } from 'react-native'

import { Icon } from './icon'
import { Swatch, type SwatchPattern } from './swatch'
import { Text } from './text'
import { toneIcon, toneTint } from './tone'

import { color, radius, space, type Tone } from '@/constants/theme'

import type { IconName } from './icon-paths'

interface Props {
  word: string
  tone: Tone
  icon?: IconName
}

const patternOf: Partial<Record<Tone, SwatchPattern>> = { safe: 'solid', cold: 'dots', hot: 'diagonal' }

/** A fact in one or two words. Weather tones carry their pattern, others an icon. */
export function Badge({ word, tone, icon }: Props) {
  const pattern = patternOf[tone]
  const tint = toneTint[tone]
  const sign = icon ?? (tone === 'caution' || tone === 'danger' ? toneIcon[tone] : undefined)
  return (
    <View style={[styles.badge, tone === 'today' ? styles.today : null]}>
      {pattern && !icon ? <Swatch pattern={pattern} tint={tint} sizePx={14} /> : null}
      {sign ? <Icon name={sign} sizePx={16} tint={tint} /> : null}
      <Text size="small" face="strong" tint={tint} style={styles.word}>
        {word}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  badge: { flexDirection: 'row', alignItems: 'center', gap: 6, minHeight: 22, maxWidth: '100%' },
  today: { backgroundColor: color.algae, paddingHorizontal: space.sm, borderRadius: radius.full },
  word: { flexShrink: 1 },
})
