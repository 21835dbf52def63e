import { StyleSheet, View } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { Equation } from '@/shared/domain/equation'
import { printSource } from '@/shared/sources'

/** The equations behind a figure, where they hold, and who published them. */
export function ToolSources({ equations }: { equations: readonly Equation[] }) {
  return (
    <Card>
      <Heading level={2} size="lead">
        How it is reckoned
      </Heading>
      {equations.map(({ text, validFor, sourceKeys }) => (
        <View key={text} style={styles.equation}>
          <Text face="strong">{text}</Text>
          <Text size="note">{`Holds for: ${validFor}.`}</Text>
          {sourceKeys.map((key) => (
            <Text key={key} size="note" tint="muted">
              {printSource(key)}
            </Text>
          ))}
        </View>
      ))}
    </Card>
  )
}

const styles = StyleSheet.create({ equation: { gap: space.xs } })
