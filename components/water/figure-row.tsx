import { StyleSheet, View } from 'react-native'

import {
  adviceWords,
  differenceWords,
  figureNames,
  groundsWords,
  printFigure,
  verdictWords,
} from './water-words'

import { Badge } from '@/components/ui/badge'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import type { FigureMatch } from '@/shared/domain/water/compare-waters'

/** One figure: theirs, yours, how far apart, the verdict as a word, what to do, and by whose limit. */
export function FigureRow({ match }: { match: FigureMatch }) {
  const units = useUnits()
  const { figure, theirs, yours, verdict } = match
  const { word, tone } = verdictWords[verdict]
  return (
    <View role="listitem" style={styles.row}>
      <View style={styles.head}>
        <Text face="strong">{figureNames[figure]}</Text>
        <Badge word={word} tone={tone} />
      </View>
      <Text isFigures>
        {`Theirs ${printFigure(figure, theirs, units)}, yours ${printFigure(figure, yours, units)}. ${differenceWords(match, units)}.`}
      </Text>
      <Text>{adviceWords(match, units)}</Text>
      <Text size="small" tint="muted">
        {groundsWords(match)}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { gap: space.xs, paddingVertical: space.md, borderTopWidth: 1, borderTopColor: color.line },
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.sm,
  },
})
