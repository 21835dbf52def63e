import { useFieldArray, useFormState } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { TierRow } from './tier-row'

import { fieldIdOf } from '@/components/forms/field-id'
import { Button } from '@/components/ui/button'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type { BatchTyping } from './batch-typing'

const most = 8

export function TiersEditor() {
  const { fields, append, remove } = useFieldArray<BatchTyping, 'tiers'>({ name: 'tiers' })
  const { errors } = useFormState<BatchTyping>({ name: 'tiers' })
  const id = fieldIdOf('tiers')
  return (
    <View role="group" aria-labelledby={`${id}-label`} nativeID={id} tabIndex={-1} style={styles.editor}>
      <View>
        <Text face="strong" nativeID={`${id}-label`}>
          Price
        </Text>
        <Text size="note" tint="muted">
          Larger orders must cost less for each fish.
        </Text>
      </View>
      {fields.map((tier, at) => (
        <TierRow key={tier.id} at={at} onRemove={fields.length > 1 ? () => remove(at) : undefined} />
      ))}
      {errors.tiers?.root?.message ? (
        <FieldError id={`${id}-error`} error={errors.tiers.root.message} />
      ) : null}
      {fields.length < most ? (
        <Button
          kind="secondary"
          icon="plus"
          label="Add a price for larger orders"
          onPress={() =>
            append({ fromCount: '', unitCents: '' }, { focusName: `tiers.${fields.length}.fromCount` })
          }
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({ editor: { gap: space.md } })
