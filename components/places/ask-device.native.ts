import * as Location from 'expo-location'

import type { NoLocation } from './ask-device'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

export async function askDevice(): Promise<CellPoint | NoLocation> {
  const { granted } = await Location.requestForegroundPermissionsAsync()
  if (!granted) return 'refused'
  try {
    const { coords } = await Location.getCurrentPositionAsync({ accuracy: Location.Accuracy.Low })
    return { lat: coords.latitude, lng: coords.longitude }
  } catch {
    return 'unknown'
  }
}
