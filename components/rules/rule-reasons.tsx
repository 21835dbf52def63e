import { useId, useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { RuleReason } from './rule-reason'

import { Button } from '@/components/ui/button'
import { color } from '@/constants/theme'
import type { GateVerdict } from '@/shared/contracts/rules'

type Reasons = GateVerdict['reasons']

/** The rules behind a verdict. Those that decide it stand open; plain permissions wait behind one press. */
export function RuleReasons({ reasons }: { reasons: Reasons }) {
  const [isOpen, setIsOpen] = useState(false)
  const id = useId()
  const deciding = reasons.filter((reason) => reason.status !== 'allowed')
  // Where everything is allowed, one of them still shows its source and date.
  const shown = deciding.length > 0 ? deciding : reasons.slice(0, 1)
  const others = reasons.filter((reason) => !shown.includes(reason))
  const what = others.length === 1 ? 'the other rule' : `the other ${others.length} rules`
  return (
    <View>
      <RuleList reasons={shown} />
      {others.length > 0 ? (
        <Button
          kind="quiet"
          icon={isOpen ? 'up' : 'down'}
          label={isOpen ? `Hide ${what}` : `Show ${what} and the sources`}
          isExpanded={isOpen}
          controls={id}
          onPress={() => setIsOpen(!isOpen)}
        />
      ) : null}
      <View nativeID={id}>{isOpen ? <RuleList reasons={others} /> : null}</View>
    </View>
  )
}

const RuleList = ({ reasons }: { reasons: Reasons }) => (
  <View role="list" style={styles.list}>
    {reasons.map((reason) => (
      <RuleReason key={`${reason.ruleKey}-${reason.jurisdiction}-${reason.activity}`} reason={reason} />
    ))}
  </View>
)

const styles = StyleSheet.create({ list: { borderTopWidth: 1, borderTopColor: color.line } })
