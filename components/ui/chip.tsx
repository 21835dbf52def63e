import { Pressable, StyleSheet, View } from 'react-native'

import { Icon } from './icon'
import { Text } from './text'

import { color, radius, space, touchPx } from '@/constants/theme'

import type { IconName } from './icon-paths'

interface Props {
  label: string
  isSelected: boolean
  onPress: () => void
  icon?: IconName
  count?: number
}

/** A choice that is on or off. Selected: algae, a tick, and aria-pressed. */
export function Chip({ label, isSelected, onPress, icon, count }: Props) {
  const tint = isSelected ? 'onAlgae' : 'ink'
  const mark = isSelected ? 'check' : icon
  return (
    <Pressable
      role="button"
      aria-pressed={isSelected}
      onPress={onPress}
      style={({ hovered }) => [styles.chip, hovered && styles.hovered, isSelected && styles.selected]}
    >
      {mark ? <Icon name={mark} sizePx={18} tint={tint} /> : null}
      <Text size="note" face={isSelected ? 'strong' : 'body'} tint={tint}>
        {label}
      </Text>
      {count === undefined ? null : (
        <Text size="note" tint={isSelected ? 'onAlgae' : 'muted'} isFigures>
          {String(count)}
        </Text>
      )}
    </Pressable>
  )
}

interface RemovableProps {
  label: string
  onRemove: () => void
}

export function RemovableChip({ label, onRemove }: RemovableProps) {
  return (
    <View style={styles.removable}>
      <Text size="note">{label}</Text>
      <Pressable role="button" aria-label={`Remove ${label}`} onPress={onRemove} style={styles.remove}>
        <Icon name="close" sizePx={16} />
      </Pressable>
    </View>
  )
}

const styles = StyleSheet.create({
  chip: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.sm,
    minHeight: touchPx,
    paddingHorizontal: space.lg,
    borderRadius: radius.full,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.card,
  },
  hovered: { backgroundColor: color.sunk },
  selected: { backgroundColor: color.algae, borderColor: color.ink },
  removable: {
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: touchPx,
    paddingLeft: space.lg,
    borderRadius: radius.full,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.card,
  },
  remove: {
    width: touchPx,
    height: touchPx,
    alignItems: 'center',
    justifyContent: 'center',
    borderRadius: radius.full,
  },
})
