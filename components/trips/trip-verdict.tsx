import { StyleSheet, View } from 'react-native'

import { reasonFigures, verdictWords } from './reason-words'

import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import { reasonTexts } from '@/shared/domain/transport/reason-texts.facts'
import type { TripAnswer } from '@/shared/domain/transport/trip'
import { printSource } from '@/shared/sources'

/** The verdict in words, then every reason with its figure, its limit and where the limit comes from. */
export function TripVerdict({ answer }: { answer: Pick<TripAnswer, 'verdict' | 'reasons'> }) {
  const units = useUnits()
  const { title, tone } = verdictWords[answer.verdict]
  return (
    <View style={styles.frame}>
      <Banner tone={tone} title={title} isLive>
        {answer.verdict === 'safe' ? 'By what is published, and by our cautious house rules.' : undefined}
      </Banner>
      {answer.reasons.length > 0 ? (
        <View role="list" aria-label="Reasons">
          {answer.reasons.map((reason) => (
            <View key={`${reason.code}-${reason.verdict}`} role="listitem" style={styles.reason}>
              <Text size="note" face={reason.verdict === 'safe' ? 'body' : 'strong'}>
                {reasonTexts[reason.code].text}
              </Text>
              <Text size="note" tint="muted">
                {[reasonFigures(reason, units), printSource(reason.sourceKey)].filter(Boolean).join('. ')}
              </Text>
            </View>
          ))}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.md },
  reason: { paddingVertical: space.sm, borderTopWidth: 1, borderTopColor: color.line },
})
