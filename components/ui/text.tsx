import type { ReactNode } from 'react'
import { StyleSheet, Text as PlainText, type StyleProp, type TextProps, type TextStyle } from 'react-native'

import { color, font, type, type ColorName, type TypeSize } from '@/constants/theme'

interface Props extends Omit<TextProps, 'style'> {
  children?: ReactNode
  size?: TypeSize
  face?: keyof typeof font
  tint?: ColorName
  /** Digits of one width: columns of figures, counts that change. */
  isFigures?: boolean
  style?: StyleProp<TextStyle>
}

export function Text({ size = 'body', face = 'body', tint = 'ink', isFigures, style, ...rest }: Props) {
  const figures = isFigures ? styles.figures : null
  return <PlainText {...rest} style={[type[size], font[face], { color: color[tint] }, figures, style]} />
}

const styles = StyleSheet.create({ figures: { fontVariant: ['tabular-nums'] } })
