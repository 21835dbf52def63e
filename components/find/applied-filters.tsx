import { StyleSheet, View } from 'react-native'

import { appliedWords } from './applied-words'
import type { FindState } from './find-params'

import { Button } from '@/components/ui/button'
import { RemovableChip } from '@/components/ui/chip'
import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'

interface Props {
  state: FindState
  thisMonday: string | undefined
  onChange: (part: Partial<FindState>) => void
}

/** What narrows the list now, each to be taken off by itself. */
export function AppliedFilters({ state, thisMonday, onChange }: Props) {
  const applied = appliedWords(state, useUnits(), thisMonday)
  if (applied.length === 0) return null
  const none = Object.assign({}, ...applied.map(({ off }) => off)) as Partial<FindState>
  return (
    <View role="group" aria-label="Filters in use" style={styles.row}>
      {applied.map(({ words, off }) => (
        <RemovableChip key={words} label={words} onRemove={() => onChange(off)} />
      ))}
      {applied.length > 1 ? (
        <Button kind="quiet" label="Clear all filters" onPress={() => onChange(none)} />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ row: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm } })
