import type { ReactNode } from 'react'
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native'

import { color, radius, space } from '@/constants/theme'

interface Props {
  children: ReactNode
  /** Names the card as a region of its own. */
  labelledBy?: string
  isSunk?: boolean
  style?: StyleProp<ViewStyle>
}

export function Card({ children, labelledBy, isSunk, style }: Props) {
  return (
    <View
      role={labelledBy ? 'region' : undefined}
      aria-labelledby={labelledBy}
      style={[styles.card, isSunk ? styles.sunk : null, style]}
    >
      {children}
    </View>
  )
}

const styles = StyleSheet.create({
  card: {
    backgroundColor: color.card,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
    padding: space.lg,
    gap: space.md,
  },
  sunk: { backgroundColor: color.sunk, borderColor: color.sunk },
})
