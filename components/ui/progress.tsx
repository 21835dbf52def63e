import { StyleSheet, View } from 'react-native'

import { Text } from './text'

import { color, radius, space } from '@/constants/theme'

interface Props {
  label: string
  /** 0 to 1. */
  fraction: number
  /** What stands behind the bar: "3 of 12 photos". */
  valueText: string
}

export function Progress({ label, fraction, valueText }: Props) {
  const percent = Math.round(Math.min(1, Math.max(0, fraction)) * 100)
  return (
    <View style={styles.frame}>
      <View style={styles.words}>
        <Text size="note">{label}</Text>
        <Text size="note" tint="muted" isFigures>
          {valueText}
        </Text>
      </View>
      <View
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        aria-valuetext={valueText}
        style={styles.track}
      >
        <View style={[styles.done, { width: `${percent}%` }]} />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xs, alignSelf: 'stretch' },
  words: { flexDirection: 'row', justifyContent: 'space-between', gap: space.md },
  track: {
    height: 10,
    borderRadius: radius.full,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.sunk,
    overflow: 'hidden',
  },
  done: { height: '100%', backgroundColor: color.netting },
})
