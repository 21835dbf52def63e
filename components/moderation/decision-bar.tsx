import { StyleSheet, View } from 'react-native'

import { Button } from '@/components/ui/button'
import { space } from '@/constants/theme'

import type { DecisionKind } from './decision-words'

interface Props {
  onDecide: (kind: DecisionKind) => void
  /** Keys stand on the buttons where there is a keyboard. */
  hasKeys: boolean
}

export function DecisionBar({ onDecide, hasKeys }: Props) {
  const label = (word: string, key: string) => (hasKeys ? `${word} (${key})` : word)
  return (
    <View role="group" aria-label="Decision" style={[styles.bar, hasKeys ? styles.stacked : null]}>
      <Button
        label={label('Approve', 'a')}
        icon="check"
        onPress={() => onDecide('approve')}
        style={styles.one}
      />
      <Button kind="secondary" label={label('Ask', 's')} onPress={() => onDecide('ask')} style={styles.one} />
      <Button
        kind="secondary"
        label={label('Reject', 'r')}
        onPress={() => onDecide('reject')}
        style={styles.one}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  bar: { flexDirection: 'row', gap: space.sm },
  stacked: { flexDirection: 'column' },
  one: { flexGrow: 1, alignSelf: 'auto' },
})
