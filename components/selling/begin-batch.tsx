import { useRouter } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { kindOf } from './kind-of'
import { kindWords } from './kind-words'
import { SellerGate } from './seller-gate'
import { useBegin } from './use-begin'

import type { Category } from '@/components/find/find-params'
import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useOwnListings } from '@/hooks/use-own-listings'
import type { OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'

const mostCopies = 3

/** The one question before the form: like an earlier listing of its kind, or from nothing. */
export function BeginBatch({ kind }: { kind: Category }) {
  return <SellerGate>{(farm) => <BeginChoices key={kind} kind={kind} farm={farm} />}</SellerGate>
}

function BeginChoices({ kind, farm }: { kind: Category; farm: OwnSeller }) {
  const router = useRouter()
  const listings = useOwnListings(true)
  const begin = useBegin(farm)
  const [chosen, setChosen] = useState('')
  const words = kindWords[kind]
  if (listings.isPending) return <TagSkeleton label="Loading your listings" count={1} />
  const ofKind = (listings.data?.pages[0]?.items ?? []).filter((own) => kindOf(own) === kind)
  const earlier = ofKind
    .filter((own) => own.liveVersion !== undefined || own.review !== undefined)
    .slice(0, mostCopies)
  function start(copyOf: OwnListing | undefined) {
    setChosen(copyOf?.listingId ?? 'empty')
    begin.mutate(
      { kind, copyOf, last: earlier[0] ?? ofKind[0] },
      {
        onSuccess: ({ listingId }) =>
          router.replace({ pathname: '/sell/listings/[listingId]', params: { listingId } }),
      },
    )
  }
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
            {words.earlier}
          </Heading>
          <Text tint="muted" size="note">
            {words.takenOver}
          </Text>
          {earlier.map((own) => (
            <Button
              key={own.listingId}
              kind={own === earlier[0] ? 'primary' : 'secondary'}
              icon="sell"
              isWide
              label={own.title}
              spokenLabel={`${own.title}: list another like it`}
              isBusy={begin.isPending && chosen === own.listingId}
              isDisabled={begin.isPending && chosen !== own.listingId}
              onPress={() => start(own)}
            />
          ))}
        </Card>
      ) : null}
      <Card>
        <Heading level={2} size="lead">
          {earlier.length > 0 ? 'Something else' : 'Something new'}
        </Heading>
        <Text tint="muted" size="note">
          {words.atHand}
        </Text>
        <Button
          kind={earlier.length > 0 ? 'secondary' : 'primary'}
          icon="plus"
          isWide
          label={words.begin}
          isBusy={begin.isPending && chosen === 'empty'}
          isDisabled={begin.isPending && chosen !== 'empty'}
          onPress={() => start(undefined)}
        />
      </Card>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
