import { StyleSheet, View } from 'react-native'

import type { FindState } from './find-params'

import { shortDay } from '@/components/listings/shipping-words'
import { Checkbox } from '@/components/ui/checkbox'
import { Select } from '@/components/ui/select'
import { space } from '@/constants/theme'
import { isoWeekOf } from '@/shared/domain/season/iso-week'
import { comingMonday } from '@/shared/times/coming-monday'

interface Props {
  state: FindState
  thisMonday: string
  onChange: (part: Partial<FindState>) => void
}

const WEEKS = 52

/** What usually arrives alive where the buyer is, in a week of the year ahead. */
export function ShipFields({ state: { shipWeek }, thisMonday, onChange }: Props) {
  const thisWeek = Math.min(isoWeekOf(thisMonday) ?? 1, WEEKS)
  const chosen = shipWeek === undefined ? undefined : Math.min(shipWeek, WEEKS)
  const weeks = Array.from({ length: WEEKS }, (_, ahead) => ((thisWeek - 1 + ahead) % WEEKS) + 1)
  return (
    <View style={styles.frame}>
      <Checkbox
        label="Can be shipped to me in the week of …"
        hint="The day itself is looked at again when you order."
        isChecked={chosen !== undefined}
        onChange={(isOn) => onChange({ shipWeek: isOn ? thisWeek : undefined })}
      />
      {chosen === undefined ? null : (
        <Select
          label="Week of"
          hint="By the weather of many years, not by a forecast."
          value={String(chosen)}
          choices={weeks.map((week) => ({ value: String(week), label: weekLabel(thisMonday, week) }))}
          onChange={(week) => onChange({ shipWeek: Number(week) })}
        />
      )}
    </View>
  )
}

function weekLabel(thisMonday: string, week: number): string {
  const monday = comingMonday(thisMonday, week)
  const day = shortDay(monday)
  if (monday === thisMonday) return `${day} (this week)`
  return monday.slice(0, 4) === thisMonday.slice(0, 4) ? day : `${day}, ${monday.slice(0, 4)}`
}

const styles = StyleSheet.create({ frame: { gap: space.sm } })
