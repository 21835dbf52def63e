import { StyleSheet, View } from 'react-native'

import type { AddressTyping } from './ship-address'

import { Field, type FieldProps } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { space } from '@/constants/theme'

interface Props {
  address: AddressTyping
  onChange: (address: AddressTyping) => void
  /** State codes the seller ships to. */
  states: readonly string[]
  errorAt: (fieldId: string) => string | undefined
}

// The browser's own word for a town; the native list of words has another one, which browsers do not know.
const town = 'address-level2' as NonNullable<FieldProps['autoComplete']>

/** Where the box goes. Only the seller reads it, and it is printed on the label. */
export function AddressFields({ address, onChange, states, errorAt }: Props) {
  const part = (name: Exclude<keyof AddressTyping, 'state'>) => ({
    fieldId: `ship-${name}`,
    value: address[name],
    onChangeText: (text: string) => onChange({ ...address, [name]: text }),
    error: errorAt(`ship-${name}`),
  })
  return (
    <View style={styles.fields}>
      <Field label="Name" autoComplete="name" maxLength={80} {...part('name')} />
      <Field label="Street and number" autoComplete="street-address" maxLength={120} {...part('street')} />
      <Field label="Town" autoComplete={town} maxLength={64} {...part('city')} />
      <View style={styles.row}>
        <View style={styles.cell}>
          <Select
            label="State"
            fieldId="ship-state"
            value={address.state}
            choices={states.map((code) => ({ value: code, label: code }))}
            emptyLabel="Choose"
            onChange={(state) => onChange({ ...address, state })}
            error={errorAt('ship-state')}
          />
        </View>
        <View style={styles.cell}>
          <Field
            label="ZIP"
            autoComplete="postal-code"
            inputMode="numeric"
            maxLength={5}
            hint="For rules and weather."
            {...part('zip')}
          />
        </View>
      </View>
      <Field
        label="Phone"
        autoComplete="tel"
        inputMode="tel"
        maxLength={24}
        hint="For the carrier, and for the seller on the day."
        {...part('phone')}
      />
    </View>
  )
}

const styles = StyleSheet.create({
  fields: { gap: space.lg },
  row: { flexDirection: 'row', flexWrap: 'wrap', gap: space.lg, alignItems: 'flex-end' },
  cell: { flexGrow: 1, flexBasis: 140, minWidth: 120 },
})
