import { StyleSheet, View } from 'react-native'

import { CommittedField } from './committed-field'
import type { FindState } from './find-params'

import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import { parseLengthCm, printLength } from '@/shared/units/length'

interface Props {
  state: FindState
  onChange: (part: Partial<FindState>) => void
}

const mostMm = 2000

export function SizeFields({ state, onChange }: Props) {
  const units = useUnits()
  const shown = (mm: number | undefined) => (mm === undefined ? '' : printLength(mm / 10, units))
  const read = (text: string) => {
    const cm = parseLengthCm(text, units)
    const mm = cm === null ? 0 : Math.round(cm * 10)
    return mm >= 1 && mm <= mostMm ? mm : null
  }
  // "From 4 to 2 inches" is read as meant.
  function commit(sizeFromMm: number | undefined, sizeToMm: number | undefined) {
    const isTurned = sizeFromMm !== undefined && sizeToMm !== undefined && sizeFromMm > sizeToMm
    onChange(isTurned ? { sizeFromMm: sizeToMm, sizeToMm: sizeFromMm } : { sizeFromMm, sizeToMm })
  }
  const unreadable = units === 'us' ? 'A length, like 2 1/4 in.' : 'A length, like 6 cm.'
  return (
    <View style={styles.row}>
      <View style={styles.half}>
        <CommittedField
          label="Size from"
          placeholder={units === 'us' ? 'e.g. 2 in' : 'e.g. 5 cm'}
          shown={shown(state.sizeFromMm)}
          read={read}
          unreadable={unreadable}
          onCommit={(mm) => commit(mm, state.sizeToMm)}
        />
      </View>
      <View style={styles.half}>
        <CommittedField
          label="Size to"
          placeholder={units === 'us' ? 'e.g. 4 in' : 'e.g. 10 cm'}
          shown={shown(state.sizeToMm)}
          read={read}
          unreadable={unreadable}
          onCommit={(mm) => commit(state.sizeFromMm, mm)}
        />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space.md },
  half: { flex: 1, minWidth: 0 },
})
