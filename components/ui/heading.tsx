import type { ReactNode } from 'react'
import type { StyleProp, TextStyle } from 'react-native'

import { Text } from './text'

import type { ColorName, TypeSize } from '@/constants/theme'

interface Props {
  level: 1 | 2 | 3 | 4
  children: ReactNode
  size?: TypeSize
  tint?: ColorName
  nativeID?: string
  style?: StyleProp<TextStyle>
}

const sizeOf = { 1: 'hero', 2: 'title', 3: 'lead', 4: 'body' } as const

export function Heading({ level, size, ...rest }: Props) {
  const face = level === 4 ? 'strong' : 'title'
  return <Text role="heading" aria-level={level} size={size ?? sizeOf[level]} face={face} {...rest} />
}
