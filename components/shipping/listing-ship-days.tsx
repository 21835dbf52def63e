import type { UseQueryResult } from '@tanstack/react-query'
import type { Href } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { DayVerdict } from './day-verdict'
import { landedWords } from './landed-words'
import { wayWords } from './ship-day-words'

import { isShippedHere, quoteCount } from '@/components/reservations/reservation'
import { ButtonLink } from '@/components/ui/button-link'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { useShipDays } from '@/hooks/use-ship-days'
import { Problem } from '@/shared/api/problem'
import type { ShownListing } from '@/shared/contracts/listings'
import type { ShipDayOffers } from '@/shared/contracts/shipments'
import { printCount } from '@/shared/units/count'

interface Props {
  listing: ShownListing
  count: number
  near: string | undefined
  /** Something can be held from this listing now. */
  canBuy: boolean
}

const SHOWN = 3

/** What the chosen count costs at the buyer's end, and the next days on which it could leave. */
export function ListingShipDays({ listing, count, near, canBuy }: Props) {
  const isHere = isShippedHere(listing)
  const query = useShipDays({
    listingId: listing.listingId,
    near: isHere ? near : undefined,
    quantity: count,
  })
  if (!isHere || near === undefined) return null
  const reserve = {
    pathname: '/listings/[listingId]/reserve',
    params: { listingId: listing.listingId, count: String(count), way: 'ship' },
  } as Href
  return (
    <>
      <Text>
        {landedWords(count, {
          shipped: quoteCount(listing, count, 'ship'),
          collected: quoteCount(listing, count, 'collect'),
        })}
      </Text>
      <Heading level={3} size="body">
        The next ship days
      </Heading>
      <NextDays query={query} />
      {canBuy ? (
        <View style={styles.act}>
          <ButtonLink
            kind="secondary"
            icon="truck"
            href={reserve}
            label={`Have ${printCount(count)} shipped`}
          />
        </View>
      ) : null}
    </>
  )
}

function NextDays({ query }: { query: UseQueryResult<ShipDayOffers> }) {
  if (query.isPending) return <SkeletonRows label="Looking at the next ship days" rows={1} />
  if (!query.data) {
    const isRefused = query.error instanceof Problem && query.error.status < 500
    return isRefused ? (
      <Text tint="muted">{query.error.message}</Text>
    ) : (
      <ErrorState
        level={3}
        title="The next ship days did not load"
        body={query.error.message}
        onRetry={() => void query.refetch()}
        isRetrying={query.isFetching}
      />
    )
  }
  const next = query.data.days.slice(0, SHOWN)
  if (next.length === 0) return <Text tint="muted">None in the coming weeks. Look again in a few days.</Text>
  return (
    <View role="list" aria-label="The next ship days" aria-busy={query.isPlaceholderData}>
      {next.map((day) => (
        <View key={day.shipDay} role="listitem" style={styles.day}>
          <Text face="strong">{wayWords(day)}</Text>
          <DayVerdict day={day} mostReasons={2} />
        </View>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  day: { gap: 2, paddingVertical: space.sm, borderTopWidth: 1, borderTopColor: color.line },
  act: { alignItems: 'flex-start' },
})
