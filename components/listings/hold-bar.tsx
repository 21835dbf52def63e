import type { Href } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { animalWord } from './animal-words'
import { countedWords } from './counted-words'

import { ButtonLink } from '@/components/ui/button-link'
import { Text } from '@/components/ui/text'
import { layout, space } from '@/constants/theme'
import type { ShownListing } from '@/shared/contracts/listings'
import { quoteOrder } from '@/shared/domain/money/quote-order'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

// Collected at the place: no box, no freight; the fee is the seller's.
const pickup = { boxCents: 0, freightCents: 0, taxCents: 0, feeBp: 0 } as const

interface Props {
  listing: ShownListing
  count: number
  near: string | undefined
}

/** The one thing to do on a listing, always in reach. */
export function HoldBar({ listing, count, near }: Props) {
  const { listingId, body } = listing
  const depositBp = body.depositPct * 100
  const { totalCents, depositCents } = quoteOrder({
    ...pickup,
    tiers: body.tiers,
    quantity: count,
    depositBp,
  })
  const href = {
    pathname: '/listings/[listingId]/reserve',
    params: { listingId, count: String(count), ...(near ? { near } : {}) },
  } as Href
  return (
    <View style={styles.bar}>
      <View style={styles.words}>
        <Text face="strong" isFigures>
          {printCents(totalCents)} for {printCount(count)}
        </Text>
        <Text size="small" tint="muted">
          {printCents(depositCents)} deposit now, the rest before you collect
        </Text>
      </View>
      <ButtonLink
        icon="lock"
        href={href}
        label={`Hold ${countedWords(body, count)} ${body.category === 'fish' ? animalWord(body.taxonId, count) : ''}`.trim()}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.md,
    width: '100%',
    maxWidth: layout.pagePx,
    alignSelf: 'center',
  },
  words: { flex: 1, minWidth: 0 },
})
