import { StyleSheet, View } from 'react-native'

import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

interface Props {
  isOpen: boolean
  onClose: () => void
}

const keys: readonly [string, string][] = [
  ['j  n', 'Next listing'],
  ['k  p', 'Previous listing'],
  ['Enter', 'Open the one you are on'],
  ['a', 'Approve; Enter confirms'],
  ['s', 'Ask the seller'],
  ['r', 'Reject'],
  ['1 to 9, 0', 'Choose the reason while you decide'],
  ['Ctrl Enter', 'Send the decision while you write'],
  ['d', 'Jump to what changed'],
  ['u', 'Back up to the queue'],
  ['w', 'Nothing wrong, on a reported listing'],
  ['t', 'Take off sale, on a reported listing'],
  ['?', 'These keys'],
]

export function KeysSheet({ isOpen, onClose }: Props) {
  return (
    <Sheet title="Keys of the desk" isOpen={isOpen} onClose={onClose} shape="dialog">
      {keys.map(([key, act]) => (
        <View key={key} style={styles.row}>
          <View style={styles.key}>
            <Text size="note" face="strong" isFigures>
              {key}
            </Text>
          </View>
          <Text style={styles.act}>{act}</Text>
        </View>
      ))}
    </Sheet>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space.lg },
  key: {
    minWidth: 104,
    alignItems: 'center',
    paddingVertical: space.xs,
    paddingHorizontal: space.sm,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.card,
  },
  act: { flex: 1 },
})
