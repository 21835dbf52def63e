import { lazy } from 'react'
import { StyleSheet, View } from 'react-native'

import { LazyPart } from '@/components/ui/lazy-part'
import { Text } from '@/components/ui/text'
import { color } from '@/constants/theme'

import type { MapProps } from './map.types'

const MapPicture = lazy(() => import('./map-group').then((group) => ({ default: group.MapPicture })))

export function Map(props: MapProps) {
  return (
    <LazyPart label={props.label} fallback={<Waiting />}>
      <MapPicture {...props} />
    </LazyPart>
  )
}

function Waiting() {
  return (
    <View role="status" style={styles.waiting}>
      <Text tint="muted">Unfolding the map</Text>
    </View>
  )
}

const styles = StyleSheet.create({
  waiting: {
    flex: 1,
    minHeight: 240,
    alignItems: 'center',
    justifyContent: 'center',
    backgroundColor: color.sunk,
  },
})
