import { StyleSheet, View } from 'react-native'

import { legalWords } from './legal-words'
import { RuleReasons } from './rule-reasons'
import { statusWords } from './rule-words'

import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { GateVerdict } from '@/shared/contracts/rules'
import { findState } from '@/shared/domain/rules/find-state'

interface Props {
  gate: GateVerdict
}

/** What we know about the law for one buyer: the status in words, from where, how old, how sure. */
export function LegalStatus({ gate }: Props) {
  const { status, buyerState, crossesStateLine, reasons, papersNeeded, demonstration } = gate
  const { icon, tone } = legalWords(status, buyerState)
  const tint =
    tone === 'safe' ? 'safe' : tone === 'danger' ? 'danger' : tone === 'caution' ? 'warm' : 'netting'
  // Where our own policy says no, there is no rule to show.
  const ownRule = gate.buy === 'no' ? gate.cautions[0]?.text : undefined
  const state = findState(buyerState)?.name ?? buyerState
  return (
    <Card>
      <Heading level={2} size="lead">
        May I keep them?
      </Heading>
      <View style={styles.verdict}>
        <Icon name={icon} tint={tint} />
        <Text face="strong" tint={tint} style={styles.words}>
          {statusWords(status)}
        </Text>
      </View>
      <Text>
        For a buyer in {state}
        {crossesStateLine ? ', across a state line from the seller.' : ', in the same state as the seller.'}
      </Text>
      {demonstration ? (
        <Banner tone="caution" title="Demonstration only, not a reading of any law">
          This page uses rows that were made up to show how the product works.
        </Banner>
      ) : null}
      {reasons.length > 0 ? (
        <RuleReasons reasons={reasons} />
      ) : (
        <Text tint="muted">
          {ownRule ?? 'We hold no reading of any rule about this species for these places.'}
        </Text>
      )}
      {papersNeeded.length > 0 ? (
        <View>
          <Text face="strong">Papers this takes</Text>
          <View role="list">
            {papersNeeded.map((paper) => (
              <View key={paper} role="listitem">
                <Text size="note">{paper}</Text>
              </View>
            ))}
          </View>
        </View>
      ) : null}
    </Card>
  )
}

const styles = StyleSheet.create({
  verdict: { flexDirection: 'row', alignItems: 'center', gap: space.sm },
  words: { flex: 1, minWidth: 0 },
})
