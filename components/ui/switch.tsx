import { useId } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'

import { onSpace } from './on-space'
import { Text } from './text'

import { color, radius, space, touchPx } from '@/constants/theme'

interface Props {
  label: string
  isOn: boolean
  onChange: (isOn: boolean) => void
  hint?: string
  isDisabled?: boolean
}

/** A setting that takes effect at once. On and off are said in words, not by colour alone. */
export function Switch({ label, isOn, onChange, hint, isDisabled }: Props) {
  const id = useId()
  return (
    <Pressable
      role="switch"
      aria-checked={isOn}
      aria-labelledby={`${id}-label`}
      aria-describedby={hint ? `${id}-hint` : undefined}
      disabled={isDisabled}
      onPress={() => onChange(!isOn)}
      onKeyDown={isDisabled ? undefined : onSpace(() => onChange(!isOn))}
      style={styles.row}
    >
      <View style={styles.words}>
        <Text nativeID={`${id}-label`} tint={isDisabled ? 'muted' : 'ink'}>
          {label}
        </Text>
        {hint ? (
          <Text size="note" tint="muted" nativeID={`${id}-hint`}>
            {hint}
          </Text>
        ) : null}
      </View>
      <View style={styles.state} aria-hidden>
        <Text size="note" tint="muted">
          {isOn ? 'On' : 'Off'}
        </Text>
        <View style={[styles.track, isOn && styles.trackOn]}>
          <View style={[styles.knob, isOn && styles.knobOn]} />
        </View>
      </View>
    </Pressable>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.lg,
    minHeight: touchPx,
    paddingVertical: space.sm,
  },
  words: { flex: 1 },
  state: { flexDirection: 'row', alignItems: 'center', gap: space.sm },
  track: {
    width: 48,
    height: 28,
    borderRadius: radius.full,
    borderWidth: 2,
    borderColor: color.edge,
    backgroundColor: color.sunk,
    justifyContent: 'center',
  },
  trackOn: { backgroundColor: color.algae, borderColor: color.ink },
  knob: { width: 18, height: 18, marginLeft: 3, borderRadius: radius.full, backgroundColor: color.edge },
  knobOn: { marginLeft: 23, backgroundColor: color.onAlgae },
})
