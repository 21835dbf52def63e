import { StyleSheet, View } from 'react-native'

import { CategoryChips } from './category-chips'
import { CommittedField } from './committed-field'
import { DayFields } from './day-fields'
import { usualWithinKm } from './find-params'
import { reaches, reachOf } from './reach'
import { ShipFields } from './ship-fields'
import { SizeFields } from './size-fields'
import { SortSelect } from './sort-select'
import { SpeciesField } from './species-field'
import type { Find } from './use-find'

import { Checkbox } from '@/components/ui/checkbox'
import { Select } from '@/components/ui/select'
import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import { parseCount, printCount } from '@/shared/units/count'
import { parseDollars, printCents } from '@/shared/units/money'

/** Every filter takes effect as it is set; the address follows. */
export function Filters({ find }: { find: Find }) {
  const { state, change, near } = find
  const units = useUnits()
  return (
    <View style={styles.frame}>
      <SortSelect sort={find.sort} hasPlace={near !== undefined} onChange={(sort) => change({ sort })} />
      <CategoryChips find={find} />
      {near ? (
        <Select
          label="Within"
          value={String(reachOf(state.withinKm ?? usualWithinKm, units).km)}
          choices={reaches(units).map(({ km, label }) => ({ value: String(km), label }))}
          onChange={(km) => change({ withinKm: Number(km) })}
        />
      ) : null}
      <CommittedField
        label="How many do you want?"
        hint="Prices are then for that many."
        placeholder="e.g. 20"
        shown={state.count === undefined ? '' : printCount(state.count)}
        read={(text) => positive(parseCount(text), 1_000_000)}
        unreadable="A whole number, like 20."
        onCommit={(count) => change({ count })}
      />
      <SpeciesField find={find} />
      <SizeFields state={state} onChange={change} />
      <DayFields state={state} onChange={change} />
      <CommittedField
        label="At most, for one"
        prefix="$"
        placeholder="e.g. 1.50"
        shown={state.mostCents === undefined ? '' : printCents(state.mostCents).slice(1)}
        read={(text) => positive(parseDollars(text), 10_000_000)}
        unreadable="An amount, like 1.50."
        onCommit={(mostCents) => change({ mostCents })}
      />
      <Checkbox
        label="Pickup offered"
        hint="You collect at the grower’s place or a public one."
        isChecked={state.pickup === 'yes'}
        onChange={(isOn) => change({ pickup: isOn ? 'yes' : undefined })}
      />
      {near && find.thisMonday ? (
        <ShipFields state={state} thisMonday={find.thisMonday} onChange={change} />
      ) : null}
    </View>
  )
}

const positive = (value: number | null, most: number) =>
  value !== null && value >= 1 && value <= most ? value : null

const styles = StyleSheet.create({ frame: { gap: space.lg } })
