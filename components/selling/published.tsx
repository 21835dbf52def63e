import { StyleSheet, View } from 'react-native'

import { OwnListingGate } from './own-listing-gate'
import { ownFacts } from './own-facts'
import { SellerGate } from './seller-gate'

import { Tag } from '@/components/listings/tag'
import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import type { OwnListing } from '@/shared/contracts/listings'

/** What became of a batch that was just published, and what comes next. */
export function Published({ listingId }: { listingId: string }) {
  return (
    <SellerGate>
      {() => (
        <OwnListingGate listingId={listingId} isFresh>
          {(own) => <Outcome own={own} />}
        </OwnListingGate>
      )}
    </SellerGate>
  )
}

function Outcome({ own }: { own: OwnListing }) {
  const units = useUnits()
  const { listingId } = own
  return (
    <View style={styles.frame}>
      <OutcomeBanner own={own} />
      <Tag size="row" facts={{ ...ownFacts(own, units), href: undefined }} />
      <View style={styles.next}>
        <Heading level={2} size="lead">
          What happens next
        </Heading>
        {nextSteps(own).map((sentence, at) => (
          <View key={sentence} style={styles.step}>
            <Text face="strong" tint="muted" isFigures>
              {String(at + 1)}
            </Text>
            <Text style={styles.words}>{sentence}</Text>
          </View>
        ))}
      </View>
      <View style={styles.acts}>
        <ButtonLink href="/sell" label="To your listings" />
        {own.state === 'live' ? (
          <ButtonLink
            kind="secondary"
            icon="eye"
            label="See it as buyers do"
            href={{ pathname: '/listings/[listingId]', params: { listingId } }}
          />
        ) : null}
        <ButtonLink kind="quiet" icon="plus" href="/sell/listings/new" label="List something else" />
      </View>
    </View>
  )
}

function OutcomeBanner({ own }: { own: OwnListing }) {
  const waits = own.review?.state === 'waiting'
  if (own.state === 'live' && waits) {
    return (
      <Banner tone="info" title="Your change waits for a moderator" icon="clock" isLive>
        Until then the version that was approved stays on sale.
      </Banner>
    )
  }
  if (own.state === 'live') {
    return (
      <Banner tone="safe" title="Live now" isLive>
        Growers near you can find it from this minute on.
      </Banner>
    )
  }
  return (
    <Banner tone="info" title="Waiting for a moderator" icon="clock" isLive>
      Nobody else sees it until it is approved.
    </Banner>
  )
}

function nextSteps({ state, review }: OwnListing): string[] {
  const waits = review?.state === 'waiting' || state === 'pending_review'
  return [
    ...(waits ? ['A moderator reads it and looks at the photos. You get a mail either way.'] : []),
    'When somebody orders you get a mail, and the order stands on your selling page.',
    'You see name and pickup time of the buyer. They see your address once the pickup is scheduled.',
    'At the pickup you both count, the buyer shows a code, and you type it in.',
  ]
}

const styles = StyleSheet.create({
  frame: { gap: space.xl },
  next: { gap: space.md },
  step: { flexDirection: 'row', gap: space.md },
  words: { flex: 1 },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
})
