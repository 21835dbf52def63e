import { StyleSheet, View } from 'react-native'

import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

/** One fact of an order: its name beside it. */
export function Fact({ name, children }: { name: string; children: string }) {
  return (
    <View style={styles.fact}>
      <Text size="note" tint="muted" style={styles.name}>
        {name}
      </Text>
      <Text style={styles.value}>{children}</Text>
    </View>
  )
}

const styles = StyleSheet.create({
  fact: { flexDirection: 'row', gap: space.md, flexWrap: 'wrap' },
  name: { width: 128 },
  value: { flex: 1, minWidth: 180 },
})
