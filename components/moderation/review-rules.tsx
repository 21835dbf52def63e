import { StyleSheet, View } from 'react-native'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { Review } from '@/shared/contracts/moderation'
import { findState } from '@/shared/domain/rules/find-state'

import type { Href } from 'expo-router'

const statuses: Record<string, string> = {
  allowed: 'Allowed, by what was found',
  allowed_with_conditions: 'Allowed under conditions',
  permit_buyer: 'Buyer needs a permit',
  permit_seller: 'Seller needs a permit',
  permit_both: 'Both need a permit',
  unknown: 'Not checked',
  prohibited: 'Prohibited',
}
const sureness: Record<string, string> = {
  P: 'read at the source',
  S: 'from a secondary text',
  H: 'hearsay, a hint only',
  D: 'demonstration only, not a reading of any law',
}

/** What is known about the species where it changes hands, from where and how old. */
export function ReviewRules({ review }: { review: Review }) {
  const { rules, seller } = review
  const state = findState(seller.state)?.name ?? seller.state
  return (
    <Card>
      <Heading level={2} size="lead">
        {`Rules in ${state}`}
      </Heading>
      {rules.length === 0 ? (
        <Text size="note" tint="muted">
          Nobody has read a rule about this species for this state yet. It can be bought inside the state
          after an explicit warning, never across its line.
        </Text>
      ) : null}
      {rules.map((rule) => (
        <View key={`${rule.ruleKey}-${rule.jurisdiction}-${rule.activity}`} style={styles.rule}>
          <Text size="note" face="strong" tint={rule.status === 'prohibited' ? 'danger' : 'ink'}>
            {`${statuses[rule.status] ?? rule.status}: to ${rule.activity}`}
          </Text>
          <Text size="small" tint="muted">
            {`${rule.sourceTitle}, ${rule.sourceDate}; looked at ${rule.checkedOn}, ${sureness[rule.confidence] ?? 'not known how sure'}.`}
            {rule.overdue ? ' Overdue: counts as not checked.' : ''}
          </Text>
          {rule.sourceUrl ? (
            <Link href={rule.sourceUrl as Href} isExternal size="small" label={`Source: ${rule.sourceTitle}`}>
              Source
            </Link>
          ) : null}
        </View>
      ))}
    </Card>
  )
}

const styles = StyleSheet.create({
  rule: { gap: 2, paddingTop: space.sm, borderTopWidth: 1, borderTopColor: color.line },
})
