import type { Href } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { unitCentsAt } from './order-count'
import { percent } from './percent'

import { ButtonLink } from '@/components/ui/button-link'
import { Text } from '@/components/ui/text'
import { layout, space } from '@/constants/theme'
import type { ShownListing } from '@/shared/contracts/listings'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

interface Props {
  listing: ShownListing
  count: number
  near: string | undefined
}

/** The one thing to do on a listing, always in reach. */
export function HoldBar({ listing, count, near }: Props) {
  const { listingId, body } = listing
  const totalCents = unitCentsAt(body.tiers, count) * count
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
          {percent(body.depositPct)} deposit now, before sales tax
        </Text>
      </View>
      <ButtonLink icon="lock" href={href} label={`Hold ${printCount(count)} fish`} />
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
