import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { pinOf, toPins } from './pins'
import { resultId } from './result-tag'
import { usualWithinKm } from './find-params'
import type { Find } from './use-find'

import { Map } from '@/components/map/map'
import type { MapArea } from '@/components/map/map.types'
import { Button } from '@/components/ui/button'
import { showElement } from '@/components/find/show-element'
import { space } from '@/constants/theme'
import { buyerCellAt } from '@/shared/domain/geo/location-cell'
import { printCellId } from '@/shared/domain/geo/location-cell-id'

interface Props {
  find: Find
  selectedPin: string
  onSelect: (pin: string) => void
}

// The middle of the 48 states and a circle around them (from memory), as long as no place is known.
const wholeCountry = { center: { lat: 39.83, lng: -98.58 }, radiusKm: 2300 }

export function ResultMap({ find, selectedPin, onSelect }: Props) {
  const [movedTo, setMovedTo] = useState<MapArea | null>(null)
  const { place, found, state } = find
  const area = place
    ? { center: { lat: place.lat, lng: place.lng }, radiusKm: state.withinKm ?? usualWithinKm }
    : wholeCountry

  function select(pin: string) {
    onSelect(pin)
    const first = found.find((listing) => pinOf(listing) === pin)
    if (first) showElement(resultId(first.listingId))
  }
  function searchHere({ center, radiusKm }: MapArea) {
    const cell = buyerCellAt(center)
    if (!cell) return
    setMovedTo(null)
    find.change({ near: printCellId(cell), withinKm: Math.min(4000, Math.max(1, Math.round(radiusKm))) })
  }

  return (
    <View style={styles.frame}>
      <Map
        label={find.placeLabel ? `Listings near ${find.placeLabel}` : 'Listings in the country'}
        center={area.center}
        radiusKm={area.radiusKm}
        pins={toPins(found)}
        selectedId={selectedPin || undefined}
        onSelect={select}
        onMoveEnd={setMovedTo}
      />
      {movedTo ? (
        <View style={styles.over}>
          <Button icon="find" label="Search here" onPress={() => searchHere(movedTo)} />
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { flex: 1, minHeight: 280 },
  over: {
    position: 'absolute',
    top: space.md,
    left: 0,
    right: 0,
    alignItems: 'center',
    pointerEvents: 'box-none',
  },
})
