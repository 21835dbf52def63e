import { StyleSheet, View } from 'react-native'

import { OnSaleNow } from './on-sale-now'
import { answerWords, licenceWords, ratingWords, sinceWords } from './seller-words'

import { FactRows } from '@/components/listings/fact-rows'
import { markKeys, markNames, survivalWords } from '@/components/ratings/rating-words'
import { SellerRatings } from '@/components/ratings/seller-ratings'
import { Banner } from '@/components/ui/banner'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'
import type { ShownSeller } from '@/hooks/use-sellers'
import { printCount } from '@/shared/units/count'
import { findState } from '@/shared/domain/rules/find-state'

function markFacts({ marks, rating }: ShownSeller) {
  if (!marks || !rating) return []
  return markKeys.map((key) => ({
    term: markNames[key],
    value: `${marks[key].toFixed(1)} of 5 (${printCount(rating.count)})`,
  }))
}

export function SellerStory({ seller }: { seller: ShownSeller }) {
  const { me } = useMe()
  const answers = answerWords(seller)
  const survival = survivalWords(seller.survival)
  return (
    <>
      {me?.sellerId === seller.sellerId ? (
        <Banner tone="info" title="This is your own page">
          This is how buyers see it. Your street and phone show only to the other party of a scheduled order.
        </Banner>
      ) : null}
      {seller.about ? (
        <Card>
          <Heading level={2} size="lead">
            In their own words
          </Heading>
          <Text>{seller.about}</Text>
        </Card>
      ) : null}
      <OnSaleNow sellerId={seller.sellerId} />
      <FactRows
        title="Record"
        facts={[
          {
            term: 'Ratings',
            value: `${ratingWords(seller)}. Only buyers who were handed their animals can rate.`,
          },
          ...markFacts(seller),
          { term: 'Day 7', value: survival ? `${survival}.` : undefined },
          { term: 'Answers', value: answers ? `${answers}.` : 'No requests yet.' },
          { term: 'On Tankward', value: `${sinceWords(seller)}.` },
        ]}
      />
      <FactRows
        title="Licences, as they told us"
        facts={seller.licences.map(({ state, answer }) => ({
          term: findState(state)?.name ?? state,
          value: licenceWords(answer),
        }))}
      />
      <SellerRatings sellerId={seller.sellerId} />
      <View style={styles.acts}>
        <ButtonLink kind="secondary" icon="find" href="/" label="Find listings near you" />
      </View>
    </>
  )
}

const styles = StyleSheet.create({ acts: { paddingTop: space.sm } })
