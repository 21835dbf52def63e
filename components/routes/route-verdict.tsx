import { StyleSheet, View } from 'react-native'

import { routeDetail, routeLook } from './route-words'

import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { toneTint } from '@/components/ui/tone'
import type { RouteRow } from '@/shared/contracts/ship-acts'

export function RouteVerdict({ row }: { row: RouteRow }) {
  const { word, tone, icon } = routeLook(row)
  const detail = routeDetail(row)
  return (
    <View style={styles.frame}>
      <View style={styles.line}>
        <Icon name={icon} sizePx={18} tint={toneTint[tone]} />
        <Text size="note" face="strong" tint={toneTint[tone]}>
          {word}
        </Text>
      </View>
      {detail ? (
        <Text size="note" tint="muted">
          {detail}
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: 2, flexShrink: 1 },
  line: { flexDirection: 'row', alignItems: 'center', gap: 6 },
})
