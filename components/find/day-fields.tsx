import { StyleSheet, View } from 'react-native'

import type { FindState } from './find-params'

import { DateField } from '@/components/ui/date-field'
import { space } from '@/constants/theme'

interface Props {
  state: FindState
  onChange: (part: Partial<FindState>) => void
}

/** Both ends are optional; a first day after the last one moves the last one along. */
export function DayFields({ state: { from, until }, onChange }: Props) {
  return (
    <View style={styles.frame}>
      <DateField
        label="To be had from"
        value={from ?? ''}
        onChange={(day) =>
          onChange(day && until && day > until ? { from: day, until: day } : { from: day || undefined })
        }
      />
      <DateField
        label="Until"
        value={until ?? ''}
        min={from}
        onChange={(day) =>
          onChange(day && from && day < from ? { from: day, until: day } : { until: day || undefined })
        }
      />
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.md } })
