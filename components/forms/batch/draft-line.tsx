import { StyleSheet, View } from 'react-native'

import { printClock } from '@/components/forms/day-text'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { space, type ColorName } from '@/constants/theme'

import type { IconName } from '@/components/ui/icon-paths'
import type { DraftState } from '@/hooks/draft-keeper'

interface Look {
  text: string
  icon?: IconName
  tint: ColorName
  /** Read out when it appears: only what the seller would want to be interrupted for. */
  isSpoken?: boolean
}

/** Where the words are: saved, on their way, or kept here. */
export function DraftLine({ state }: { state: DraftState }) {
  const { text, icon, tint, isSpoken } = lookOf(state)
  return (
    <View role={isSpoken ? 'status' : undefined} style={styles.line}>
      {icon ? <Icon name={icon} sizePx={16} tint={tint} /> : null}
      <Text size="small" tint={tint} isFigures style={styles.words}>
        {text}
      </Text>
    </View>
  )
}

function lookOf(state: DraftState): Look {
  switch (state.kind) {
    case 'quiet':
      return { text: 'Saves itself as you type', tint: 'muted' }
    case 'typing':
    case 'saving':
      return { text: 'Saving', tint: 'muted' }
    case 'saved':
      return { text: `Saved ${printClock(state.at)}`, icon: 'check', tint: 'safe' }
    case 'on-device':
      return {
        text: 'No connection: kept on this device, sent later',
        icon: 'clock',
        tint: 'warm',
        isSpoken: true,
      }
    case 'stale':
      return { text: 'Changed elsewhere: nothing is overwritten', icon: 'warn', tint: 'warm', isSpoken: true }
    case 'refused':
      return { text: `Not saved. ${state.message}`, icon: 'stop', tint: 'danger', isSpoken: true }
  }
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', alignItems: 'center', gap: space.xs, minHeight: 24 },
  words: { flexShrink: 1 },
})
