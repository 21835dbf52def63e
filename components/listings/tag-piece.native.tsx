import type { ReactNode } from 'react'
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native'

import { color, radius } from '@/constants/theme'

export type PieceSide = 'right' | 'bottom'

interface Props {
  kind: 'body' | 'stub'
  seam: PieceSide
  isHot?: boolean
  children: ReactNode
  style?: StyleProp<ViewStyle>
}

// React Native cannot cut a view: hole and corner are painted over in the colour of the ground.
export function TagPiece({ kind, children, style }: Props) {
  return (
    <View style={[styles.piece, style]}>
      {children}
      {kind === 'body' ? <View style={styles.corner} /> : null}
      {kind === 'body' ? <View style={styles.hole} /> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  piece: {
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.tag,
    overflow: 'hidden',
  },
  corner: {
    position: 'absolute',
    top: -16,
    left: -16,
    width: 32,
    height: 32,
    transform: [{ rotate: '45deg' }],
    backgroundColor: color.mist,
    borderRightWidth: 1,
    borderRightColor: color.edge,
  },
  hole: {
    position: 'absolute',
    top: 17,
    left: 17,
    width: 14,
    height: 14,
    borderRadius: 7,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.mist,
  },
})
