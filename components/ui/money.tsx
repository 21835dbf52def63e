import { Text } from './text'

import { printCents } from '@/shared/units/money'

import type { ColorName, TypeSize } from '@/constants/theme'

interface Props {
  cents: number
  /** What the sum is for: "deposit". Money is never shown without it. */
  purpose: string
  size?: TypeSize
  tint?: ColorName
  isStrong?: boolean
  /** The purpose already stands beside it as a table head or term. */
  isPurposeHidden?: boolean
}

export function Money({ cents, purpose, size, tint, isStrong, isPurposeHidden }: Props) {
  const sum = printCents(cents)
  return (
    <Text size={size} tint={tint} face={isStrong ? 'strong' : 'body'} isFigures>
      {isPurposeHidden ? sum : `${sum} ${purpose}`}
    </Text>
  )
}
