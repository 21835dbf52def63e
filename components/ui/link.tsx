import { Link as RouterLink, type Href } from 'expo-router'
import type { ReactNode } from 'react'
import { StyleSheet, type StyleProp, type TextStyle } from 'react-native'

import { color, font, type, type TypeSize } from '@/constants/theme'

interface Props {
  href: Href
  children: ReactNode
  size?: TypeSize
  /** Spoken instead of the children; must begin with the words that are seen. */
  label?: string
  isExternal?: boolean
  isCurrent?: boolean
  onPress?: () => void
  style?: StyleProp<TextStyle>
}

export function Link({ size = 'body', label, isExternal, isCurrent, style, ...rest }: Props) {
  const outside = isExternal ? ({ target: '_blank', rel: 'noopener noreferrer' } as const) : {}
  return (
    <RouterLink
      {...rest}
      {...outside}
      aria-label={label}
      aria-current={isCurrent ? 'page' : undefined}
      style={[type[size], font.body, styles.link, style]}
    />
  )
}

const styles = StyleSheet.create({ link: { color: color.netting, textDecorationLine: 'underline' } })
