import { useController } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { fieldIdOf } from '@/components/forms/field-id'
import { Chip } from '@/components/ui/chip'
import { FieldError } from '@/components/ui/field-frame'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { findState } from '@/shared/domain/rules/find-state'

import type { BatchTyping } from './batch-typing'
import type { OwnSeller } from '@/shared/contracts/sellers'

/** The states whose buyers may order: those the farm has answered the licence question for. */
export function StatesServed({ farm }: { farm: OwnSeller }) {
  const { field, fieldState } = useController<BatchTyping, 'statesServed'>({ name: 'statesServed' })
  const id = fieldIdOf('statesServed')
  const answered = farm.licences.map((licence) => licence.state)
  const offered = [...new Set([...answered, ...field.value])].sort()
  const error = fieldState.error?.message
  const toggle = (code: string) => {
    field.onChange(
      field.value.includes(code) ? field.value.filter((one) => one !== code) : [...field.value, code],
    )
    field.onBlur()
  }
  return (
    <View
      role="group"
      nativeID={id}
      tabIndex={-1}
      aria-labelledby={`${id}-label`}
      aria-describedby={error ? `${id}-error` : undefined}
      style={styles.field}
    >
      <Text face="strong" nativeID={`${id}-label`}>
        Buyers from these states
      </Text>
      <View style={styles.chips}>
        {offered.map((code) => (
          <Chip
            key={code}
            label={findState(code)?.name ?? code}
            isSelected={field.value.includes(code)}
            onPress={() => toggle(code)}
          />
        ))}
      </View>
      {error ? <FieldError id={`${id}-error`} error={error} /> : null}
      <Text size="note" tint="muted">
        {'To sell into another state, '}
        <Link href="/sell/farm" size="note">
          answer its licence question
        </Link>
        {' first. This draft is kept.'}
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
