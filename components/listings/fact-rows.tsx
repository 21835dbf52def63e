import { StyleSheet, View } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'

export interface Fact {
  term: string
  /** undefined: nothing was said, so the row is left out. */
  value: string | undefined
}

interface Props {
  title: string
  facts: readonly Fact[]
}

/** A group of facts: the term, and what it means here. */
export function FactRows({ title, facts }: Props) {
  const told = facts.filter((fact): fact is Fact & { value: string } => Boolean(fact.value))
  return (
    <Card>
      <Heading level={2} size="lead">
        {title}
      </Heading>
      <View role="list">
        {told.map(({ term, value }, index) => (
          <View key={term} role="listitem" style={[styles.row, index > 0 ? styles.ruled : null]}>
            <Text size="note" tint="muted" style={styles.term}>
              {term}
            </Text>
            <Text style={styles.value}>{value}</Text>
          </View>
        ))}
      </View>
    </Card>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.lg, paddingVertical: space.sm },
  ruled: { borderTopWidth: 1, borderTopColor: color.line },
  term: { width: 150, paddingTop: 2 },
  value: { flexGrow: 1, flexShrink: 1, flexBasis: 220 },
})
