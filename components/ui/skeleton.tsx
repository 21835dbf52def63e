import { StyleSheet, View, type DimensionValue } from 'react-native'

import { color, radius, space } from '@/constants/theme'

interface BlockProps {
  width?: DimensionValue
  heightPx?: number
}

/** A place kept for words that are on their way; it pulses unless motion is reduced (global.css). */
export function SkeletonBlock({ width = '100%', heightPx = 16 }: BlockProps) {
  return <View style={[styles.block, { width, height: heightPx }]} dataSet={{ pulse: '' }} />
}

interface Props {
  /** What is loading: "Loading listings". */
  label: string
  rows?: number
}

export function SkeletonRows({ label, rows = 4 }: Props) {
  return (
    <View role="status" aria-label={label} aria-busy style={styles.rows}>
      {Array.from({ length: rows }, (_, row) => (
        <View key={row} style={styles.row}>
          <SkeletonBlock width="55%" heightPx={22} />
          <SkeletonBlock width="80%" />
          <SkeletonBlock width="35%" />
        </View>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  block: { backgroundColor: color.line, borderRadius: radius.tag },
  rows: { gap: space.md },
  row: { gap: space.sm, padding: space.lg, backgroundColor: color.card, borderRadius: radius.tag },
})
