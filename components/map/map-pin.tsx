import { Pressable, StyleSheet, View } from 'react-native'

import { Text } from '@/components/ui/text'
import { color, radius, touchPx } from '@/constants/theme'

import type { PinGroup } from './cluster-pins'

interface Props {
  group: PinGroup
  isSelected: boolean
  onPress: () => void
}

export function MapPin({ group, isSelected, onPress }: Props) {
  const { pins, count, at } = group
  const only = pins.length === 1 ? pins[0] : undefined
  const label = only ? only.label : `${count} listings in ${pins.length} places, come closer`
  return (
    <Pressable
      role="button"
      aria-label={label}
      aria-pressed={isSelected}
      onPress={onPress}
      style={({ hovered }) => [
        styles.target,
        { left: at.x - touchPx / 2, top: at.y - 40 },
        (isSelected || hovered) && styles.front,
      ]}
    >
      <View style={[styles.tag, isSelected ? styles.selected : null]}>
        <Text size="note" face="strong" tint={isSelected ? 'onAlgae' : 'onNetting'} isFigures>
          {count > 999 ? '999+' : String(count)}
        </Text>
      </View>
      <View style={[styles.stem, isSelected ? styles.selectedStem : null]} />
    </Pressable>
  )
}

const styles = StyleSheet.create({
  target: {
    position: 'absolute',
    width: touchPx,
    height: touchPx,
    alignItems: 'center',
    justifyContent: 'flex-end',
    paddingBottom: 4,
    borderRadius: radius.tag,
  },
  front: { zIndex: 1 },
  tag: {
    minWidth: 30,
    height: 26,
    paddingHorizontal: 6,
    alignItems: 'center',
    justifyContent: 'center',
    backgroundColor: color.netting,
    borderRadius: radius.tag,
    borderTopLeftRadius: 0,
    borderWidth: 1,
    borderColor: color.card,
  },
  selected: { backgroundColor: color.algae, borderColor: color.onAlgae, borderWidth: 2 },
  stem: { width: 2, height: 8, backgroundColor: color.netting },
  selectedStem: { backgroundColor: color.ink },
})
