import { StyleSheet } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'
import type { OwnListing } from '@/shared/contracts/listings'
import { takeDownWords } from '@/shared/domain/listings/take-down-words'

/** Why a listing went off sale, and what it means for its orders. */
export function TakenDown({ own }: { own: OwnListing }) {
  if (!own.takenDown) return null
  const { reason, note } = own.takenDown
  return (
    <Banner tone="danger" title="A moderator took this off sale">
      {takeDownWords[reason] ? <Text size="note">{takeDownWords[reason]}</Text> : null}
      {note ? (
        <Text size="note" style={styles.quote}>
          {note}
        </Text>
      ) : null}
      <Text size="note">
        {own.openOrders > 0
          ? 'Its open orders stand as agreed. To object, answer the mail about it.'
          : 'To object, answer the mail about it: a person reads it.'}
      </Text>
    </Banner>
  )
}

const styles = StyleSheet.create({ quote: { fontStyle: 'italic' } })
