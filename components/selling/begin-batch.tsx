import { useRouter } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { SellerGate } from './seller-gate'

import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { newRequestKey } from '@/hooks/request-key'
import { useBeginListing, useOwnListings } from '@/hooks/use-own-listings'

const mostCopies = 3

/** The one question before the form: like an earlier batch, or from nothing. */
export function BeginBatch() {
  return <SellerGate>{() => <BeginChoices />}</SellerGate>
}

function BeginChoices() {
  const router = useRouter()
  const listings = useOwnListings(true)
  const begin = useBeginListing()
  const [key] = useState(newRequestKey)
  const [chosen, setChosen] = useState('')
  function start(copyOf: string | undefined) {
    setChosen(copyOf ?? 'empty')
    // One key a choice: pressing the same twice begins one draft.
    begin.mutate(
      { copyOf, key: `${key}-${(copyOf ?? 'empty').slice(0, 24)}` },
      {
        onSuccess: ({ listingId }) =>
          router.replace({ pathname: '/sell/listings/[listingId]', params: { listingId } }),
      },
    )
  }
  if (listings.isPending) return <TagSkeleton label="Loading your listings" count={1} />
  const earlier = (listings.data?.pages[0]?.items ?? [])
    .filter((own) => own.liveVersion !== undefined || own.review !== undefined)
    .slice(0, mostCopies)
  return (
    <View style={styles.frame}>
      {begin.error ? (
        <Banner tone="danger" title="The draft was not begun" isLive>
          {begin.error.message}
        </Banner>
      ) : null}
      {earlier.length > 0 ? (
        <Card>
          <Heading level={2} size="lead">
            Like an earlier batch
          </Heading>
          <Text tint="muted" size="note">
            Species, prices, terms and words are taken over. Count, dates, health, photos and pickup windows
            are asked anew.
          </Text>
          {earlier.map((own) => (
            <Button
              key={own.listingId}
              kind={own === earlier[0] ? 'primary' : 'secondary'}
              icon="sell"
              isWide
              label={own.title}
              spokenLabel={`${own.title}: list another batch like it`}
              isBusy={begin.isPending && chosen === own.listingId}
              isDisabled={begin.isPending && chosen !== own.listingId}
              onPress={() => start(own.listingId)}
            />
          ))}
        </Card>
      ) : null}
      <Card>
        <Heading level={2} size="lead">
          {earlier.length > 0 ? 'Something else' : 'A new batch'}
        </Heading>
        <Text tint="muted" size="note">
          Have at hand: the count, a photo with a ruler beside the fish, and a water test not older than 14
          days. It saves itself, so you can stop and go on later.
        </Text>
        <Button
          kind={earlier.length > 0 ? 'secondary' : 'primary'}
          icon="plus"
          isWide
          label="Begin with an empty form"
          isBusy={begin.isPending && chosen === 'empty'}
          isDisabled={begin.isPending && chosen !== 'empty'}
          onPress={() => start(undefined)}
        />
      </Card>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
