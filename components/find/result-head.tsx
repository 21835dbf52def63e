import { StyleSheet, View } from 'react-native'

import { AppliedFilters } from './applied-filters'
import { appliedWords } from './applied-words'
import type { Sort } from './find-params'
import type { Find } from './use-find'

import { Button } from '@/components/ui/button'
import { HiddenText } from '@/components/ui/hidden-text'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import { printCount } from '@/shared/units/count'

interface Props {
  find: Find
  /** Absent where the filters stand beside the list. */
  onFilters?: () => void
  /** Absent where the map stands beside the list. */
  view?: 'list' | 'map'
  onView?: (view: 'list' | 'map') => void
}

export function ResultHead({ find, onFilters, view, onView }: Props) {
  const narrowed = appliedWords(find.state, useUnits()).length
  const said = foundWords(find)
  return (
    <View style={styles.frame}>
      <View style={styles.row}>
        {onFilters ? (
          <Button
            kind="secondary"
            icon="filter"
            label={narrowed > 0 ? `Filters and order (${narrowed})` : 'Filters and order'}
            onPress={onFilters}
          />
        ) : null}
        {view && onView ? (
          <Button
            kind="secondary"
            icon={view === 'map' ? 'list' : 'map'}
            label={view === 'map' ? 'List' : 'Map'}
            onPress={() => onView(view === 'map' ? 'list' : 'map')}
          />
        ) : null}
      </View>
      <AppliedFilters state={find.state} thisMonday={find.thisMonday} onChange={find.change} />
      {said ? (
        <Text tint="muted" size="note">
          {said}
        </Text>
      ) : null}
      <HiddenText isLive>{find.search.isFetching ? '' : said}</HiddenText>
    </View>
  )
}

const orders: Record<Sort, string> = {
  nearest: 'nearest first',
  cheapest: 'cheapest first',
  soonest: 'soonest pickup first',
  'best-rated': 'best rated first',
}

function foundWords({ search, found, placeLabel, near, sort }: Find): string {
  if (search.isError && found.length === 0) return ''
  if (search.isPending || search.isPlaceholderData) return search.isPaused ? '' : 'Looking…'
  const many = `${printCount(found.length)}${search.hasNextPage ? '+' : ''}`
  const what = found.length === 1 ? 'listing' : 'listings'
  if (!near)
    return `${many} ${what} in the whole country, ${orders[sort]}. Say where you are to see what is near.`
  return `${many} ${what} near ${placeLabel}, ${orders[sort]}`
}

const styles = StyleSheet.create({
  frame: { gap: space.md },
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-end', gap: space.sm },
})
