import { StyleSheet, View } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'

import type { ToolAnswer } from './tool'

/** null: a field still has to be filled in. */
export function ToolResult({ answer }: { answer: ToolAnswer | null }) {
  return (
    <View aria-live="polite">
      {answer === null ? (
        <Banner tone="info" title="Waiting for a figure">
          One field cannot be read yet.
        </Banner>
      ) : 'refusal' in answer ? (
        <Banner tone="caution" title="No answer for these figures">
          {answer.refusal}
        </Banner>
      ) : (
        <Card>
          <Heading level={2} size="lead">
            Answer
          </Heading>
          <View role="list">
            {answer.lines.map(({ label, text }, at) => (
              <View key={label} role="listitem" style={[styles.line, at > 0 ? styles.ruled : null]}>
                <Text size="note" tint="muted">
                  {label}
                </Text>
                <Text size={at === 0 ? 'title' : 'body'} face={at === 0 ? 'title' : 'strong'} isFigures>
                  {text}
                </Text>
              </View>
            ))}
          </View>
          {answer.note ? <Text size="note">{answer.note}</Text> : null}
        </Card>
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  line: { paddingVertical: space.sm, gap: 2 },
  ruled: { borderTopWidth: 1, borderTopColor: color.line },
})
