import { StyleSheet, View } from 'react-native'

import { HiddenText } from './hidden-text'
import { Text } from './text'

import { color, radius, space } from '@/constants/theme'

interface Props {
  label: string
  steps: readonly string[]
  /** Index of the step being filled in. */
  current: number
}

/** Where a stepped form is. On a phone the words of the other steps give way to their numbers. */
export function Steps({ label, steps, current }: Props) {
  return (
    <View style={styles.frame}>
      <View role="list" aria-label={label} style={styles.row}>
        {steps.map((step, index) => (
          <View
            key={step}
            role="listitem"
            aria-current={index === current ? 'step' : undefined}
            style={styles.step}
          >
            <View style={[styles.bar, index < current && styles.done, index === current && styles.now]} />
            <HiddenText>{index < current ? `${step}, done` : step}</HiddenText>
          </View>
        ))}
      </View>
      <View style={styles.words} aria-hidden>
        <Text size="note" tint="muted" isFigures>
          {`Step ${current + 1} of ${steps.length}`}
        </Text>
        <Text size="note" face="strong">
          {steps[current] ?? ''}
        </Text>
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.sm },
  row: { flexDirection: 'row', gap: space.xs },
  step: { flex: 1 },
  bar: {
    height: 8,
    borderRadius: radius.full,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.sunk,
  },
  done: { backgroundColor: color.netting, borderColor: color.netting },
  now: { backgroundColor: color.algae, borderColor: color.ink },
  words: { flexDirection: 'row', alignItems: 'center', gap: space.sm },
})
