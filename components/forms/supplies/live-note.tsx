import { StyleSheet, View } from 'react-native'

import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

interface Props {
  /** Nothing to say: nothing is drawn. */
  words: string | null | undefined
  /** A caution wears its sign; a plain note does not. */
  tone?: 'caution' | 'plain'
}

/** What is judged beside a field while it is filled; read out when it changes. */
export function LiveNote({ words, tone = 'plain' }: Props) {
  return (
    <View role="status" style={words ? null : styles.silent}>
      {words ? (
        <View style={styles.row}>
          {tone === 'caution' ? <Icon name="warn" sizePx={18} tint="warm" /> : null}
          <Text size="note" tint={tone === 'caution' ? 'warm' : 'muted'} isFigures style={styles.words}>
            {words}
          </Text>
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.sm },
  words: { flex: 1, minWidth: 0 },
  // Stays for readers, and takes no room between the fields.
  silent: { position: 'absolute' },
})
