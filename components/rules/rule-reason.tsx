import type { Href } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { confidenceWords, reasonTitle, statusWords } from './rule-words'

import { plainDay } from '@/components/listings/pickup-words'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { GateVerdict } from '@/shared/contracts/rules'

interface Props {
  reason: GateVerdict['reasons'][number]
}

/** One rule: what it says, who wrote it, when somebody looked, and how sure that is. */
export function RuleReason({ reason }: Props) {
  const { sourceTitle, sourceDate, checkedOn, overdue } = reason
  const address = webAddress(reason.sourceUrl)
  return (
    <View role="listitem" style={styles.row}>
      <Text size="note" face="strong">
        {reasonTitle(reason)}. {statusWords(reason.status)}.
      </Text>
      <Text size="note">
        Source: {sourceTitle}, {sourceDate}. Looked at {plainDay(checkedOn)}.
        {overdue ? ' That is too long ago, so it counts as not checked.' : ''}
      </Text>
      <Text size="note" tint="muted">
        {confidenceWords(reason)}
      </Text>
      {address ? (
        <Link isExternal size="note" href={address.href as Href}>
          Open the source at {address.host}
        </Link>
      ) : null}
    </View>
  )
}

function webAddress(text: string | undefined): URL | null {
  try {
    const url = new URL(text ?? '')
    return url.protocol === 'https:' || url.protocol === 'http:' ? url : null
  } catch {
    return null
  }
}

const styles = StyleSheet.create({
  row: { paddingVertical: space.md, gap: 2, borderBottomWidth: 1, borderBottomColor: color.line },
})
