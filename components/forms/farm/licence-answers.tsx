import { useState } from 'react'
import { useFieldArray, useFormState } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { LicenceRow } from './licence-row'

import { fieldIdOf } from '@/components/forms/field-id'
import { FieldError } from '@/components/ui/field-frame'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { stateFacts } from '@/shared/domain/rules/us-states.facts'

import type { FarmTyping } from './farm-typing'

interface Props {
  ownState: string
}

/** One answer a state: the farm's own first, then every state it wants to sell into. */
export function LicenceAnswers({ ownState }: Props) {
  const { fields, append, remove } = useFieldArray<FarmTyping, 'licences'>({ name: 'licences' })
  const { errors } = useFormState<FarmTyping>({ name: 'licences' })
  const [chosen, setChosen] = useState('')
  const answered = new Set(fields.map((licence) => licence.state))
  const open = stateFacts.filter((state) => state.takesAnimals && !answered.has(state.code))
  const id = fieldIdOf('licences')
  const rootFault = errors.licences?.root?.message
  return (
    <View role="group" aria-label="Licence answers" nativeID={id} tabIndex={-1} style={styles.list}>
      {fields.length === 0 ? (
        <Text tint="muted">Choose your state above; its question appears here.</Text>
      ) : null}
      {fields.map((licence, at) => (
        <LicenceRow
          key={licence.id}
          at={at}
          state={licence.state}
          onRemove={licence.state === ownState ? undefined : () => remove(at)}
        />
      ))}
      {rootFault ? <FieldError id={`${id}-error`} error={rootFault} /> : null}
      {fields.length > 0 ? (
        <Select
          label="Sell into another state"
          hint="Its question is added above."
          isOptional
          value={chosen}
          emptyLabel="Choose a state to add"
          choices={open.map(({ code, name }) => ({ value: code, label: name }))}
          onChange={(code) => {
            append({ state: code, answer: '', number: '' }, { shouldFocus: false })
            setChosen('')
          }}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ list: { gap: space.lg } })
