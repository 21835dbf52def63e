import { StyleSheet, View } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

export interface Caution {
  id: string
  text: string
}

export function CautionList({ cautions }: { cautions: readonly Caution[] }) {
  return (
    <Card>
      <Heading level={2} size="lead">
        Please mind
      </Heading>
      <View role="list" style={styles.list}>
        {cautions.map(({ id, text }) => (
          <View key={id} role="listitem" style={styles.row}>
            <Icon name="warn" sizePx={20} tint="warm" />
            <Text size="note" style={styles.words}>
              {text}
            </Text>
          </View>
        ))}
      </View>
    </Card>
  )
}

const styles = StyleSheet.create({
  list: { gap: space.sm },
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.sm },
  words: { flex: 1, minWidth: 0 },
})
