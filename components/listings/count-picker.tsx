import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { countedNoun, countedWords } from './counted-words'
import { fitCount, type CountLimits } from './order-count'

import { IconButton } from '@/components/ui/icon-button'
import { NumberField } from '@/components/ui/number-field'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import type { SupplyBody } from '@/components/supplies/supply-body'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { parseCount, printCount } from '@/shared/units/count'

interface Props {
  body: FishBody | SupplyBody
  count: number
  limits: CountLimits
  onChange: (count: number) => void
}

/** How many, in the steps of the seller; what does not fit is moved to the closest that does, and said. */
export function CountPicker({ body, count, limits, onChange }: Props) {
  const [typed, setTyped] = useState<string | null>(null)
  const [said, setSaid] = useState('')
  const { least, step, most } = limits
  function commit() {
    if (typed === null) return
    const wanted = parseCount(typed)
    const fitting = wanted === null ? null : fitCount(wanted, limits)
    setTyped(null)
    if (wanted === null || fitting === null) {
      setSaid('A whole number, please.')
      return
    }
    setSaid(
      fitting === wanted
        ? ''
        : `${printCount(wanted)} cannot be had here. The closest is ${countedWords(body, fitting)}.`,
    )
    onChange(fitting)
  }
  function move(by: number) {
    setSaid('')
    setTyped(null)
    onChange(fitCount(count + by, limits) ?? count)
  }
  const steps = step > 1 ? `, in steps of ${printCount(step)}` : ''
  return (
    <View style={styles.frame}>
      <View style={styles.row}>
        <View style={styles.field}>
          <NumberField
            label="How many?"
            suffix={countedNoun(body, count) || undefined}
            hint={`From ${printCount(least)} to ${printCount(most)}${steps}.`}
            value={typed ?? printCount(count)}
            inputMode="numeric"
            enterKeyHint="done"
            onChangeText={setTyped}
            onBlur={commit}
            onSubmitEditing={commit}
          />
        </View>
        <View style={styles.steps}>
          <IconButton
            icon="minus"
            label={`Fewer: ${step} less`}
            isDisabled={count <= least}
            onPress={() => move(-step)}
          />
          <IconButton
            icon="plus"
            label={`More: ${step} more`}
            isDisabled={count + step > most}
            onPress={() => move(step)}
          />
        </View>
      </View>
      <View role="status">{said ? <Text size="note">{said}</Text> : null}</View>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xs },
  row: { flexDirection: 'row', alignItems: 'flex-end', gap: space.xs },
  field: { flex: 1, minWidth: 0 },
  steps: { flexDirection: 'row', paddingBottom: 2 },
})
