import { useState } from 'react'
import { useFormContext } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { checkAgain } from './check-again'

import { BoundText } from '@/components/forms/bound/bound-text'
import { figures } from '@/components/forms/figure'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { parseLengthCm, printLength } from '@/shared/units/length'

import type { BatchTyping } from './batch-typing'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  name: 'sizeLoMm' | 'sizeHiMm'
  label: string
  placeholder: string
  units: UnitSystem
}

const visibleMm = 0.5

/** A length in any unit. Leaving the field shows the quarter-inch step it is kept in, and says so where that moved it. */
export function LengthField({ name, label, placeholder, units }: Props) {
  const form = useFormContext<BatchTyping>()
  const [note, setNote] = useState('')
  function settle() {
    checkAgain(form, ['sizeHiMm'])
    if (form.getFieldState('ungraded').error) void form.trigger('ungraded')
    checkAgain(form, ['stage'])
    const text = form.getValues(name).trim()
    const cm = parseLengthCm(text, units)
    const mm = figures.batchLengthMm.read(text, units)
    if (cm === null || mm === null || mm === 0) return setNote('')
    const kept = figures.batchLengthMm.print(mm, units)
    const inches = units === 'metric' ? ` (${printLength(mm / 10, 'us')})` : ''
    setNote(
      Math.abs(cm * 10 - mm) > visibleMm
        ? `${text} is kept as ${kept}${inches}: sizes go in quarter inches.`
        : '',
    )
    if (kept !== text) form.setValue(name, kept, { shouldDirty: true, shouldValidate: true })
  }
  return (
    <View style={styles.field}>
      <BoundText<BatchTyping> name={name} label={label} placeholder={placeholder} isFigure onLeave={settle} />
      {note ? (
        <Text size="note" tint="muted" role="status">
          {note}
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ field: { gap: space.xs } })
