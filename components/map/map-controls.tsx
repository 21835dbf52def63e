import { StyleSheet, View } from 'react-native'

import { kmPerPixel, type MapView } from './map-view'
import { scaleBar } from './scale-bar'

import { IconButton } from '@/components/ui/icon-button'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

interface Props {
  view: MapView
  onZoom: (factor: number) => void
  onReset: () => void
}

export function MapControls({ view, onZoom, onReset }: Props) {
  const bar = scaleBar(kmPerPixel(view))
  return (
    <>
      <View style={styles.buttons}>
        <IconButton icon="plus" label="Zoom in" onPress={() => onZoom(2)} />
        <IconButton icon="minus" label="Zoom out" onPress={() => onZoom(0.5)} />
        <IconButton icon="pin" label="Back to the search area" onPress={onReset} />
      </View>
      <View style={styles.scale}>
        <Text size="small" isFigures>
          {`${bar.miles} mi`}
        </Text>
        <View style={[styles.bar, { width: bar.widthPx }]} />
      </View>
    </>
  )
}

const styles = StyleSheet.create({
  buttons: {
    position: 'absolute',
    right: space.md,
    top: space.md,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.card,
  },
  scale: {
    position: 'absolute',
    left: space.md,
    bottom: space.md,
    paddingHorizontal: space.sm,
    paddingBottom: 6,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    pointerEvents: 'none',
  },
  bar: { height: 4, backgroundColor: color.ink },
})
