import { StyleSheet, View } from 'react-native'

import { flagWords } from './flag-words'

import { Badge } from '@/components/ui/badge'
import { Text } from '@/components/ui/text'

interface Props {
  flags: readonly string[]
  /** The most telling ones; the rest is counted. All when absent. */
  most?: number
}

export function FlagList({ flags, most = flags.length }: Props) {
  const hidden = flags.length - most
  return (
    <View style={styles.list}>
      {flags.slice(0, most).map((flag) => (
        <Badge key={flag} {...flagWords(flag)} />
      ))}
      {hidden > 0 ? (
        <Text size="small" tint="muted">
          {`and ${hidden} more`}
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ list: { gap: 2, paddingVertical: 2 } })
