import { StyleSheet, View } from 'react-native'

import { waterWords } from './box-packing-words'
import { basisWords, reasonsAgainst, verdictLook } from './ship-day-words'

import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { toneTint } from '@/components/ui/tone'
import { useUnits } from '@/hooks/use-units'
import type { ShipDayOffer } from '@/shared/contracts/shipments'

interface Props {
  day: Omit<ShipDayOffer, 'shipDay' | 'arriveDay'>
  /** Where many days stand below each other: the strictest alone; all of them when absent. */
  mostReasons?: number
}

/** The verdict in words with its sign, what it rests on, and what speaks against the day. */
export function DayVerdict({ day, mostReasons }: Props) {
  const units = useUnits()
  const { word, tone, icon } = verdictLook(day)
  const water = day.packing ? waterWords(day.packing, units) : ''
  return (
    <View style={styles.frame}>
      <View style={styles.line}>
        <Icon name={icon} sizePx={18} tint={toneTint[tone]} />
        <Text size="note" style={styles.words}>
          <Text size="note" face="strong" tint={toneTint[tone]}>
            {word}
          </Text>
          {`, ${basisWords[day.basis]}`}
        </Text>
      </View>
      {day.verdict === 'safe' && water ? (
        <Text size="note" tint="muted">
          {`${day.packing?.bagsPerBox === undefined ? 'Bedding' : 'Water'} on the way ${water}.`}
        </Text>
      ) : null}
      {reasonsAgainst(day, units)
        .slice(0, mostReasons)
        .map((reason) => (
          <Text key={reason} size="note" tint="muted">
            {reason}
          </Text>
        ))}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: 2 },
  line: { flexDirection: 'row', gap: 6, alignItems: 'center' },
  words: { flexShrink: 1 },
})
