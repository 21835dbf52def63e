import { StyleSheet } from 'react-native'

import { Mark } from './mark'

import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { space, touchPx } from '@/constants/theme'

export function Brand({ isMarkOnly = false }: { isMarkOnly?: boolean }) {
  return (
    <PressLink href="/" label="Tankward, find" look={() => styles.brand}>
      <Mark sizePx={32} />
      {isMarkOnly ? null : (
        <Text size="lead" face="title">
          Tankward
        </Text>
      )}
    </PressLink>
  )
}

const styles = StyleSheet.create({
  brand: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: touchPx,
    minWidth: touchPx,
    justifyContent: 'center',
  },
})
