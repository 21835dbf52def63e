import { useState } from 'react'
import { ScrollView, StyleSheet, View } from 'react-native'

import { FilterSheet } from './filter-sheet'
import { LaterFilters } from './later-filters'
import { PinTags } from './pin-tags'
import { ResultHead } from './result-head'
import { ResultList } from './result-list'
import { ResultMap } from './result-map'
import { useFind } from './use-find'

import { Page } from '@/components/layout/page'
import { ThreeColumns } from '@/components/layout/three-columns'
import { PlaceField } from '@/components/places/place-field'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

export function FindScreen() {
  const find = useFind()
  const breakpoint = useBreakpoint()
  const [isFiltering, setIsFiltering] = useState(false)
  const [view, setView] = useState<'list' | 'map'>('list')
  const [chosenPin, setChosenPin] = useState('')
  const [hotPin, setHotPin] = useState('')
  const selectedPin = hotPin || chosenPin
  const isPhone = breakpoint === 'phone'

  const place = (
    <PlaceField
      label="Where are you?"
      placeLabel={find.placeLabel}
      onChoose={find.choosePlace}
      isSmall={find.near !== undefined}
    />
  )
  const head = (
    <ResultHead
      find={find}
      onFilters={breakpoint === 'wide' ? undefined : () => setIsFiltering(true)}
      view={isPhone ? view : undefined}
      onView={setView}
    />
  )
  const list = <ResultList find={find} selectedPin={selectedPin} onHot={setHotPin} />
  const map = <ResultMap find={find} selectedPin={selectedPin} onSelect={setChosenPin} />
  const sheet = (
    <FilterSheet
      find={find}
      isOpen={isFiltering && breakpoint !== 'wide'}
      onClose={() => setIsFiltering(false)}
    />
  )
  const heading = 'Fish, worms and greens from growers near you'
  if (isPhone) {
    return (
      <Page title="Find" heading={heading}>
        {place}
        {head}
        {view === 'map' ? <View style={styles.phoneMap}>{map}</View> : list}
        {view === 'map' ? <PinTags find={find} pin={chosenPin} /> : null}
        {sheet}
      </Page>
    )
  }
  return (
    <Page title="Find" heading={heading} width="full" isScrolled={false}>
      <ThreeColumns
        filters={{ label: 'Filters', content: <LaterFilters find={find} /> }}
        main={{
          label: 'Listings',
          content: (
            <ScrollView contentContainerStyle={styles.column}>
              {place}
              {head}
              {list}
            </ScrollView>
          ),
        }}
        map={{ label: 'Map', content: map }}
      />
      {sheet}
    </Page>
  )
}

const styles = StyleSheet.create({
  phoneMap: { height: 460 },
  column: { gap: space.lg, padding: space.xs, paddingBottom: space.huge },
})
