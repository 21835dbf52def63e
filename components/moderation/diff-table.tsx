import { StyleSheet, View } from 'react-native'

import { answerWords } from './answer-text'
import { fieldWords } from './field-words'

import { Badge } from '@/components/ui/badge'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import type { Review } from '@/shared/contracts/moderation'

interface Props {
  review: Review
}

/** Old and new side by side, what takes the listing off sale first. */
export function DiffTable({ review }: Props) {
  const { before, changes, number } = review
  if (!before) return null
  return (
    <Card labelledBy="diff">
      <Heading level={2} size="lead" nativeID="diff">
        {`What changed since version ${before.number}`}
      </Heading>
      {changes.length === 0 ? <Text tint="muted">Nothing: the same was sent again.</Text> : null}
      {changes.map((change) => (
        <DiffRow key={change.field} change={change} numbers={[before.number, number]} />
      ))}
    </Card>
  )
}

interface RowProps {
  change: Review['changes'][number]
  numbers: readonly [number, number]
}

function DiffRow({ change, numbers }: RowProps) {
  const isPhone = useBreakpoint() === 'phone'
  const { field, material } = change
  return (
    <View style={styles.row}>
      <View style={styles.head}>
        <Text face="strong">{fieldWords(field)}</Text>
        {material ? <Badge word="takes it off sale" tone="caution" icon="warn" /> : null}
      </View>
      <View style={isPhone ? styles.stacked : styles.sides}>
        <Side caption={`Version ${numbers[0]}`} text={answerWords(field, change.before)} />
        <Side caption={`Version ${numbers[1]}`} text={answerWords(field, change.after)} isNew />
      </View>
    </View>
  )
}

function Side({ caption, text, isNew }: { caption: string; text: string; isNew?: boolean }) {
  return (
    <View style={[styles.side, isNew ? styles.fresh : styles.past]}>
      <Text size="small" tint="muted">
        {caption}
      </Text>
      <Text size="note" tint={text ? 'ink' : 'muted'} isFigures>
        {text || 'not answered'}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { gap: space.sm, paddingTop: space.md, borderTopWidth: 1, borderTopColor: color.line },
  head: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.md },
  sides: { flexDirection: 'row', gap: space.sm },
  stacked: { gap: space.sm },
  side: { flex: 1, minWidth: 0, padding: space.md, borderLeftWidth: 4, backgroundColor: color.sunk },
  past: { borderLeftColor: color.edge },
  fresh: { borderLeftColor: color.netting },
})
