import { useState } from 'react'
import { useController } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { findListableTaxa, whyNotListed } from './find-listable-taxa'

import { fieldIdOf } from '@/components/forms/field-id'
import { Combobox } from '@/components/ui/combobox'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { findTaxon } from '@/shared/domain/species/find-taxon'

import type { BatchTyping } from './batch-typing'

/** Picks a taxon from the list. Typing something else after a choice takes the choice back: never free text. */
export function SpeciesPicker() {
  const { field, fieldState } = useController<BatchTyping, 'taxonId'>({ name: 'taxonId' })
  const chosen = findTaxon(field.value)
  const [text, setText] = useState(chosen?.commonName ?? '')
  const choices = findListableTaxa(text).map((taxon) => ({
    id: taxon.id,
    label: taxon.commonName,
    detail: taxon.scientificName,
  }))
  return (
    <View style={styles.field}>
      <Combobox
        label="Species"
        hint="Common or scientific name, then pick it from the list."
        fieldId={fieldIdOf('taxonId')}
        error={fieldState.error?.message}
        text={text}
        onChangeText={(typed) => {
          setText(typed)
          if (field.value) field.onChange('')
        }}
        choices={chosen?.commonName === text ? [] : choices}
        onChoose={(choice) => {
          setText(choice.label)
          field.onChange(choice.id)
          field.onBlur()
        }}
        emptyText={chosen?.commonName === text ? undefined : whyNotListed(text)}
        placeholder="e.g. Bluegill"
      />
      {chosen ? <ChosenSpecies taxonId={chosen.id} /> : null}
    </View>
  )
}

function ChosenSpecies({ taxonId }: { taxonId: string }) {
  const taxon = findTaxon(taxonId)
  if (!taxon) return null
  const parents = taxon.hybridParents?.map((id) => findTaxon(id)?.commonName ?? id)
  return (
    <Text size="note" tint="muted">
      {parents
        ? `${taxon.scientificName}. A cross of ${parents.join(' and ')}: where a state asks for a permit for either, it asks for one here.`
        : taxon.scientificName}
    </Text>
  )
}

const styles = StyleSheet.create({ field: { gap: space.xs } })
