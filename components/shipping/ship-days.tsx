import type { UseQueryResult } from '@tanstack/react-query'

import { ShipDayPicker } from './ship-day-picker'

import { Banner } from '@/components/ui/banner'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { Problem } from '@/shared/api/problem'
import type { ShipDayOffers } from '@/shared/contracts/shipments'

interface Props {
  query: UseQueryResult<ShipDayOffers>
  value: string
  onChange: (shipDay: string) => void
  error?: string
  /** The day agreed already: not offered once more. */
  without?: string
}

/** A refusal is an answer: asking again changes nothing. */
const isRefusal = (error: Error) => error instanceof Problem && error.status >= 400 && error.status < 500

/** The coming ship days of a way: loading, empty, refused, not loaded, or to choose from. */
export function ShipDays({ query, value, onChange, error, without }: Props) {
  if (query.isPending) return <SkeletonRows label="Looking at the coming ship days" rows={3} />
  if (!query.data) {
    return isRefusal(query.error) ? (
      <Banner tone="caution" title="Not to be shipped there" isLive>
        {query.error.message}
      </Banner>
    ) : (
      <ErrorState
        level={3}
        title="The ship days did not load"
        body={`${query.error.message} What you typed is kept.`}
        onRetry={() => void query.refetch()}
        isRetrying={query.isFetching}
      />
    )
  }
  const days = query.data.days.filter(({ shipDay }) => shipDay !== without)
  if (days.length === 0) {
    return (
      <EmptyState
        level={3}
        icon="calendar"
        title="No ship day in the coming weeks"
        body="Carriers do not work on the seller’s ship days. Look again in a few days."
      />
    )
  }
  return (
    <>
      {days.every(({ verdict }) => verdict !== 'safe') ? (
        <Banner tone="caution" title="No safe day in the coming weeks" isLive>
          Every day is shown with what speaks against it. Look again when the weather turns.
        </Banner>
      ) : null}
      <ShipDayPicker
        days={days}
        value={value}
        onChange={onChange}
        error={error}
        isBusy={query.isPlaceholderData}
      />
      <Text size="note" tint="muted">
        The way is looked at again on the evening before and on the morning of the day. If the weather turns,
        we tell you and propose another day.
      </Text>
    </>
  )
}
