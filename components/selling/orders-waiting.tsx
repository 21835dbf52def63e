import { StyleSheet } from 'react-native'

import { Icon } from '@/components/ui/icon'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

/** The one thing that cannot wait: orders that need the member's move. */
export function OrdersWaiting({ count }: { count: number }) {
  if (count === 0) return null
  const words = count === 1 ? '1 order waits for you' : `${count} orders wait for you`
  return (
    <PressLink
      href={{ pathname: '/orders', params: { as: 'seller' } }}
      look={({ hovered }) => [styles.row, hovered ? styles.hovered : null]}
    >
      <Icon name="orders" tint="onAlgae" />
      <Text face="strong" tint="onAlgae" isFigures style={styles.words}>
        {words}
      </Text>
      <Icon name="forward" sizePx={20} tint="onAlgae" />
    </PressLink>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    minHeight: 56,
    paddingHorizontal: space.lg,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.onAlgae,
    backgroundColor: color.algae,
  },
  hovered: { opacity: 0.92 },
  words: { flex: 1 },
})
