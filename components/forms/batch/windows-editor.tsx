import { useFieldArray, useFormContext, useFormState } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { WindowRow } from './window-row'

import { fieldIdOf } from '@/components/forms/field-id'
import { addDays, nextSaturday } from '@/components/forms/day-text'
import { zoneWords } from '@/shared/times/zone-words'
import { Button } from '@/components/ui/button'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type { BatchTyping } from './batch-typing'

const most = 40

interface Props {
  zone: string
  today: string
}

export function WindowsEditor({ zone, today }: Props) {
  const form = useFormContext<BatchTyping>()
  const { fields, append, insert, remove } = useFieldArray<BatchTyping, 'windows'>({ name: 'windows' })
  const { errors } = useFormState<BatchTyping>({ name: 'windows' })
  const id = fieldIdOf('windows')
  function add() {
    const last = form.getValues('windows').at(-1)
    const window = last
      ? { ...last, day: addDays(last.day, 1) }
      : { day: nextSaturday(today), from: '09:00', until: '10:00', capacity: '6' }
    append(window, { focusName: `windows.${fields.length}.day` })
  }
  function repeat(at: number) {
    const window = form.getValues(`windows.${at}`)
    insert(at + 1, { ...window, day: addDays(window.day, 7) }, { focusName: `windows.${at + 1}.day` })
  }
  return (
    <View role="group" aria-labelledby={`${id}-label`} nativeID={id} tabIndex={-1} style={styles.editor}>
      <View>
        <Text face="strong" nativeID={`${id}-label`}>
          Pickup windows
        </Text>
        <Text size="note" tint="muted">
          {`Times are ${zoneWords(zone)}, the clock at your place. Half an hour to an hour works best.`}
        </Text>
      </View>
      {fields.map((window, at) => (
        <WindowRow key={window.id} at={at} onRepeat={() => repeat(at)} onRemove={() => remove(at)} />
      ))}
      {errors.windows?.root?.message ? (
        <FieldError id={`${id}-error`} error={errors.windows.root.message} />
      ) : null}
      {fields.length < most ? (
        <Button
          kind="secondary"
          icon="plus"
          label={fields.length === 0 ? 'Add a pickup window' : 'Add another window'}
          onPress={add}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ editor: { gap: space.md } })
