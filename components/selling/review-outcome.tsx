import { StyleSheet, View } from 'react-native'

import { isAnswerDue } from './own-state-words'
import { wordsOfReason } from './review-reasons'

import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { OwnListing } from '@/shared/contracts/listings'

/** What a moderator said, and one tap to the place where it is put right. */
export function ReviewOutcome({ own }: { own: OwnListing }) {
  const { review, listingId } = own
  if (!review || !isAnswerDue(own)) return null
  const reason = wordsOfReason(review.reasonCode)
  const isAsked = review.state === 'asked'
  const still = own.state === 'live' ? ' The version buyers see stays on sale.' : ''
  return (
    <Banner
      tone={isAsked ? 'caution' : 'danger'}
      title={isAsked ? 'A moderator asks before it goes live' : 'A moderator did not approve it'}
    >
      {reason ? <Text size="note">{reason.told + still}</Text> : null}
      {review.reasonText ? (
        <Text size="note" style={styles.quote}>
          {review.reasonText}
        </Text>
      ) : null}
      {own.may.includes('edit') ? (
        <View style={styles.act}>
          <ButtonLink
            kind="secondary"
            icon="edit"
            label="Put it right"
            spokenLabel={`Put it right: ${own.title}`}
            href={{
              pathname: '/sell/listings/[listingId]',
              params: { listingId, ...(reason ? { at: reason.field } : {}) },
            }}
          />
        </View>
      ) : null}
    </Banner>
  )
}

const styles = StyleSheet.create({ quote: { fontStyle: 'italic' }, act: { paddingTop: space.xs } })
