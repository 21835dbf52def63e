import { Pressable, StyleSheet, type StyleProp, type ViewStyle } from 'react-native'

import { Icon } from './icon'

import { color, radius, touchPx, type ColorName } from '@/constants/theme'

import type { IconName } from './icon-paths'

interface Props {
  label: string
  icon: IconName
  onPress: () => void
  tint?: ColorName
  isPressed?: boolean
  isDisabled?: boolean
  nativeID?: string
  style?: StyleProp<ViewStyle>
}

export function IconButton({
  label,
  icon,
  onPress,
  tint = 'ink',
  isPressed,
  isDisabled,
  nativeID,
  style,
}: Props) {
  return (
    <Pressable
      role="button"
      nativeID={nativeID}
      aria-label={label}
      aria-pressed={isPressed}
      disabled={isDisabled}
      onPress={onPress}
      style={({ hovered }) => [styles.button, hovered && styles.hovered, isDisabled && styles.off, style]}
    >
      <Icon name={icon} tint={tint} isFilled={isPressed} />
    </Pressable>
  )
}

const styles = StyleSheet.create({
  button: {
    width: touchPx,
    height: touchPx,
    alignItems: 'center',
    justifyContent: 'center',
    borderRadius: radius.tag,
  },
  hovered: { backgroundColor: color.sunk },
  off: { opacity: 0.4 },
})
