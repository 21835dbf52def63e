import { StyleSheet, View } from 'react-native'

import { Badge } from '@/components/ui/badge'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { Review } from '@/shared/contracts/moderation'
import { findState } from '@/shared/domain/rules/find-state'

const kinds: Record<string, string> = { hatchery: 'Hatchery', grower: 'Grower' }
const answers: Record<string, string> = {
  have: 'has a licence',
  'not-needed': 'says none is needed',
  unsure: 'is not sure',
}

export function SellerRecord({ seller }: { seller: Review['seller'] }) {
  const since = new Date(seller.since).toLocaleDateString('en-US', { year: 'numeric', month: 'long' })
  return (
    <Card>
      <Heading level={2} size="lead">
        {seller.farmName}
      </Heading>
      <Text size="note">
        {`${kinds[seller.kind] ?? seller.kind} in ${findState(seller.state)?.name ?? seller.state}, here since ${since}.`}
      </Text>
      <View style={styles.counts}>
        <Badge word={`${seller.approvedBefore} approved`} tone="safe" icon="check" />
        <Badge
          word={`${seller.rejectedBefore} rejected`}
          tone={seller.rejectedBefore > 0 ? 'danger' : 'neutral'}
          icon="stop"
        />
      </View>
      {seller.licences.map(({ state, answer, number }) => (
        <Text key={state} size="note">
          {`${findState(state)?.name ?? state}: ${answers[answer] ?? answer}${number ? `, ${number}` : ''}`}
        </Text>
      ))}
    </Card>
  )
}

const styles = StyleSheet.create({ counts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.lg } })
