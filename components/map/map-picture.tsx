import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { clusterPins, type PinGroup } from './cluster-pins'
import { MapControls } from './map-controls'
import { MapDrawing } from './map-drawing'
import { MapPin } from './map-pin'
import { areaOf, fitArea, zoom, type MapView, type Size } from './map-view'
import { useMapGestures } from './use-map-gestures'

import { HiddenText } from '@/components/ui/hidden-text'
import { color, radius } from '@/constants/theme'

import type { MapProps } from './map.types'

/** Measures its place first: a view needs a size. */
export function MapPicture(props: MapProps) {
  const [size, setSize] = useState<Size>()
  return (
    <View
      style={styles.box}
      onLayout={({ nativeEvent: { layout } }) => setSize({ widthPx: layout.width, heightPx: layout.height })}
    >
      {size && size.widthPx > 0 && size.heightPx > 0 ? <SizedMap {...props} size={size} /> : null}
    </View>
  )
}

function SizedMap({ size, ...props }: MapProps & { size: Size }) {
  const { center, radiusKm, pins, selectedId } = props
  const asked = `${center.lat} ${center.lng} ${radiusKm}`
  const [fitted, setFitted] = useState(asked)
  const [view, setView] = useState<MapView>(() => fitArea({ center, radiusKm }, size))
  if (fitted !== asked) {
    setFitted(asked)
    setView(fitArea({ center, radiusKm }, size))
  }

  function tellMoved(moved: MapView) {
    props.onMoveEnd?.(areaOf(moved, size))
  }
  function move(moved: MapView) {
    setView(moved)
    tellMoved(moved)
  }
  function open(group: PinGroup) {
    const [first] = group.pins
    if (!first) return
    const isOneSpot = group.pins.every((pin) => pin.lat === first.lat && pin.lng === first.lng)
    if (isOneSpot) props.onSelect(first.id)
    else move(zoom(view, 2.5, { x: group.at.x - size.widthPx / 2, y: group.at.y - size.heightPx / 2 }))
  }

  const [surface, setSurface] = useState<View | null>(null)
  const onKeyDown = useMapGestures(surface, { view, size, onMove: setView, onMoveEnd: tellMoved })
  return (
    <View style={styles.box}>
      <View
        ref={setSurface}
        role="region"
        aria-label={props.label}
        aria-roledescription="map"
        aria-describedby="map-keys"
        tabIndex={0}
        onKeyDown={onKeyDown}
        style={styles.surface}
      >
        <MapDrawing view={view} size={size} area={{ center, radiusKm }} towns={props.towns} />
        {clusterPins(pins, view, size).map((group) => (
          <MapPin
            key={group.key}
            group={group}
            isSelected={group.pins.some(({ id }) => id === selectedId)}
            onPress={() => open(group)}
          />
        ))}
      </View>
      <HiddenText nativeID="map-keys">
        Arrow keys move the map, plus and minus zoom. Everything on the map also stands in the list.
      </HiddenText>
      <MapControls
        view={view}
        onZoom={(factor) => move(zoom(view, factor))}
        onReset={() => move(fitArea({ center, radiusKm }, size))}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  box: { flex: 1, minHeight: 240, overflow: 'hidden' },
  surface: {
    flex: 1,
    backgroundColor: color.sunk,
    overflow: 'hidden',
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.tag,
  },
})
