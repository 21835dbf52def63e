import { Link as RouterLink, type Href } from 'expo-router'
import type { ReactNode } from 'react'
import {
  Pressable,
  type GestureResponderEvent,
  type PressableStateCallbackType,
  type StyleProp,
  type ViewStyle,
} from 'react-native'

type Look = (state: PressableStateCallbackType) => StyleProp<ViewStyle>
type OnPress = (event: GestureResponderEvent) => void

interface Props {
  href: Href
  look: Look
  children: ReactNode
  /** Spoken instead of the children; must begin with the words that are seen. */
  label?: string
  isCurrent?: boolean
  nativeID?: string
  /** Called as the link is followed. */
  onFollow?: () => void
  /** Told when the pointer comes over the block and leaves it. */
  onHotChange?: (isHot: boolean) => void
}

/** A block that is one link: a tag, a row, a navigation place. */
export function PressLink({ href, onFollow, ...rest }: Props) {
  return (
    <RouterLink href={href} onPress={onFollow} asChild>
      <Surface {...rest} />
    </RouterLink>
  )
}

interface SurfaceProps extends Omit<Props, 'href' | 'onFollow'> {
  onPress?: OnPress
  onClick?: OnPress
}

// The router's slot merges `style` as an object, which loses style functions: hence `look`.
function Surface({ look, label, isCurrent, onHotChange, onPress, onClick, ...fromRouter }: SurfaceProps) {
  return (
    <Pressable
      {...fromRouter}
      role="link"
      aria-label={label}
      aria-current={isCurrent ? 'page' : undefined}
      onPress={onPress ?? onClick}
      onHoverIn={() => onHotChange?.(true)}
      onHoverOut={() => onHotChange?.(false)}
      style={look}
    />
  )
}
