import { ActivityIndicator, Pressable, type StyleProp, type ViewStyle } from 'react-native'

import { buttonLook, buttonStyles, buttonTint, type ButtonKind } from './button-look'
import { Icon } from './icon'
import { Text } from './text'

import { color } from '@/constants/theme'

import type { IconName } from './icon-paths'

interface Props {
  /** The act in words: "Hold 20 fish". */
  label: string
  onPress: () => void
  kind?: ButtonKind
  icon?: IconName
  /** Shown instead of the label while the act runs; the button cannot be pressed again. */
  busyLabel?: string
  isBusy?: boolean
  isDisabled?: boolean
  isWide?: boolean
  /** Adds what sighted people see from the place: "Remove: Nile tilapia". Must begin with the label. */
  spokenLabel?: string
  isExpanded?: boolean
  controls?: string
  nativeID?: string
  style?: StyleProp<ViewStyle>
}

export function Button(props: Props) {
  const { label, kind = 'primary', icon, isBusy = false, isDisabled = false } = props
  const isOff = isBusy || isDisabled
  const words = isBusy ? (props.busyLabel ?? label) : label
  return (
    <Pressable
      role="button"
      nativeID={props.nativeID}
      aria-label={props.spokenLabel}
      aria-busy={isBusy}
      aria-expanded={props.isExpanded}
      aria-controls={props.controls}
      disabled={isDisabled}
      onPress={isOff ? undefined : props.onPress}
      style={(state) => [
        ...buttonLook(kind, isOff ? { pressed: false } : state),
        props.isWide ? buttonStyles.wide : null,
        isDisabled ? buttonStyles.off : null,
        props.style,
      ]}
    >
      {isBusy ? <ActivityIndicator size="small" color={color[buttonTint[kind]]} aria-hidden /> : null}
      {icon && !isBusy ? <Icon name={icon} sizePx={20} tint={buttonTint[kind]} /> : null}
      <Text face="strong" tint={buttonTint[kind]}>
        {words}
      </Text>
    </Pressable>
  )
}
