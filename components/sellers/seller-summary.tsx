import { StyleSheet, View } from 'react-native'

import { answerWords, ratingWords, sinceWords } from './seller-words'

import { survivalWords } from '@/components/ratings/rating-words'
import { Badge } from '@/components/ui/badge'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { SellerCard } from '@/shared/contracts/sellers'
import { printCount } from '@/shared/units/count'

interface Props {
  seller: SellerCard
  /** How many other listings of theirs can be found now. */
  alsoOnSale: number
}

/** Who sells, on a listing: the record, and the way to the whole page. */
export function SellerSummary({ seller, alsoOnSale }: Props) {
  const answers = answerWords(seller)
  const survival = survivalWords(seller.survival)
  const more = alsoOnSale > 0 ? `${printCount(alsoOnSale)} more from this farm` : 'More about this farm'
  return (
    <Card>
      <Heading level={2} size="lead">
        {seller.farmName}
      </Heading>
      <Text tint="muted">
        {seller.kind === 'hatchery' ? 'Hatchery' : 'Grower'} in {seller.placeText}
      </Text>
      <View style={styles.badges}>
        <Badge word={ratingWords(seller)} tone="neutral" icon="star" />
        {survival ? <Badge word={survival} tone="neutral" icon="fish" /> : null}
        {answers ? <Badge word={answers} tone="neutral" icon="clock" /> : null}
        <Badge word={sinceWords(seller)} tone="neutral" icon="calendar" />
      </View>
      <ButtonLink
        kind="quiet"
        icon="forward"
        href={{ pathname: '/sellers/[sellerId]', params: { sellerId: seller.sellerId } }}
        label={more}
        spokenLabel={`${more}: ${seller.farmName}`}
      />
    </Card>
  )
}

const styles = StyleSheet.create({ badges: { gap: space.xs } })
