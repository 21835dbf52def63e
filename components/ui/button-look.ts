import { StyleSheet, type ViewStyle } from 'react-native'

import { color, radius, space, touchPx, type ColorName } from '@/constants/theme'

export type ButtonKind = 'primary' | 'secondary' | 'quiet' | 'danger'

interface PressState {
  pressed: boolean
  hovered?: boolean
}

export const buttonTint: Record<ButtonKind, ColorName> = {
  primary: 'onPrimary',
  secondary: 'netting',
  quiet: 'netting',
  danger: 'onDanger',
}

export function buttonLook(kind: ButtonKind, state: PressState): ViewStyle[] {
  const look: ViewStyle[] = [styles.base, styles[kind]]
  if (state.hovered)
    look.push(kind === 'primary' || kind === 'danger' ? styles.hoveredSolid : styles.hoveredBare)
  if (state.pressed) look.push(styles.pressed)
  return look
}

export const buttonStyles = StyleSheet.create({
  wide: { alignSelf: 'stretch' },
  off: { opacity: 0.55 },
})

const styles = StyleSheet.create({
  base: {
    minHeight: touchPx,
    minWidth: touchPx,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    alignSelf: 'flex-start',
    gap: space.sm,
    paddingHorizontal: space.lg,
    paddingVertical: space.sm,
    borderRadius: radius.tag,
    borderWidth: 2,
    borderColor: 'transparent',
  },
  primary: { backgroundColor: color.primary },
  secondary: { backgroundColor: color.card, borderColor: color.netting },
  quiet: { backgroundColor: 'transparent', paddingHorizontal: space.md },
  danger: { backgroundColor: color.danger },
  hoveredSolid: { opacity: 0.9 },
  hoveredBare: { backgroundColor: color.sunk },
  pressed: { transform: [{ translateY: 1 }] },
})
