import { StyleSheet, View } from 'react-native'

import { NoResults } from './no-results'
import { ResultTag } from './result-tag'
import type { Find } from './use-find'

import { NoConnection } from '@/components/listings/no-connection'
import { TagSkeleton } from '@/components/listings/tag-skeleton'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { ErrorState } from '@/components/ui/error-state'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { NoAnswer } from '@/shared/api/call'
import { Problem } from '@/shared/api/problem'

interface Props {
  find: Find
  selectedPin: string
  onHot: (pin: string) => void
}

export function ResultList({ find, selectedPin, onHot }: Props) {
  const { search, found } = find
  // An empty list from before says nothing about the filters of now.
  const isWaiting = search.isPending || (search.isPlaceholderData && found.length === 0)
  if (isWaiting && search.isPaused) {
    return <NoConnection kept="Your filters are kept." onRetry={() => void search.refetch()} />
  }
  if (isWaiting) return <TagSkeleton label="Loading listings" count={4} />
  if (search.isError && found.length === 0) {
    const isSilent = search.error instanceof NoAnswer
    return (
      <ErrorState
        title={isSilent ? 'No answer' : 'The search did not work'}
        body={
          isSilent
            ? 'Your filters are kept. Try again in a moment.'
            : `${sentencesOf(search.error)} Your filters are kept.`
        }
        onRetry={() => void search.refetch()}
        isRetrying={search.isFetching}
      />
    )
  }
  if (found.length === 0) {
    const { state, placeLabel, thisMonday, change } = find
    return <NoResults state={state} placeLabel={placeLabel} thisMonday={thisMonday} onChange={change} />
  }
  return (
    <View style={styles.frame}>
      {search.isPlaceholderData && search.isPaused ? (
        <Banner isLive tone="caution" title="No connection">
          This is the list from before. Your filters are kept; the new list comes by itself as soon as there
          is a signal.
        </Banner>
      ) : null}
      {search.isError ? (
        <Banner isLive tone="caution" title="Not the latest">
          We could not ask again just now: this list is from a moment ago.
        </Banner>
      ) : null}
      <View
        role="list"
        aria-label="Listings"
        style={[styles.list, search.isPlaceholderData ? styles.old : null]}
      >
        {found.map((listing, index) => (
          <ResultTag
            key={listing.listingId}
            found={listing}
            find={find}
            isFirst={index === 0}
            selectedPin={selectedPin}
            onHot={onHot}
          />
        ))}
      </View>
      {search.isPlaceholderData ? null : <ListEnd find={find} />}
    </View>
  )
}

/** What the server found wrong, part by part where it says so. */
function sentencesOf(error: Error): string {
  const parts = error instanceof Problem ? (error.errors ?? []).map(({ detail }) => detail) : []
  const said = parts.length > 0 ? parts.join(' ') : error.message
  return /[.?!]$/.test(said) ? said : `${said}.`
}

function ListEnd({ find: { search, found } }: { find: Find }) {
  if (search.hasNextPage && search.isPaused) {
    return (
      <Banner isLive tone="caution" title="No connection">
        More will load by itself as soon as there is a signal.
      </Banner>
    )
  }
  if (search.hasNextPage) {
    return (
      <Button
        kind="secondary"
        isWide
        label="Show more"
        busyLabel="Loading more"
        isBusy={search.isFetchingNextPage}
        onPress={() => void search.fetchNextPage()}
      />
    )
  }
  return (
    <Text tint="muted" size="note" style={styles.end}>
      {found.length === 1 ? 'That is the only one.' : 'That is all of them.'}
    </Text>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  list: { gap: space.md },
  old: { opacity: 0.55 },
  end: { textAlign: 'center', paddingVertical: space.md },
})
