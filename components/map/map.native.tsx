import { StyleSheet } from 'react-native'
import MapView, { Circle, Marker, type Region } from 'react-native-maps'

import { color } from '@/constants/theme'

import type { MapProps } from './map.types'

const kmPerDegree = 111.195 // of latitude, on the mean sphere

export function Map({ label, center, radiusKm, pins, selectedId, onSelect, onMoveEnd }: MapProps) {
  const middle = { latitude: center.lat, longitude: center.lng }
  const spanDegrees = (radiusKm * 2.2) / kmPerDegree
  function tellMoved(region: Region) {
    onMoveEnd?.({
      center: { lat: region.latitude, lng: region.longitude },
      radiusKm: (region.latitudeDelta * kmPerDegree) / 2.2,
    })
  }
  return (
    <MapView
      accessibilityLabel={label}
      style={styles.map}
      initialRegion={{ ...middle, latitudeDelta: spanDegrees, longitudeDelta: spanDegrees }}
      onRegionChangeComplete={(region, details) => (details.isGesture ? tellMoved(region) : undefined)}
    >
      <Circle center={middle} radius={radiusKm * 1000} strokeColor={color.netting} />
      {pins.map((pin) => (
        <Marker
          key={pin.id}
          coordinate={{ latitude: pin.lat, longitude: pin.lng }}
          title={pin.label}
          pinColor={pin.id === selectedId ? color.algae : color.netting}
          onPress={() => onSelect(pin.id)}
        />
      ))}
    </MapView>
  )
}

const styles = StyleSheet.create({ map: { flex: 1, minHeight: 240 } })
