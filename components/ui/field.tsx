import { StyleSheet, TextInput, View, type TextInputProps } from 'react-native'

import { controlStyles } from './control-look'
import { FieldFrame, type FieldWords } from './field-frame'
import { Text } from './text'

import { color, radius, space } from '@/constants/theme'

type Typing = Pick<
  TextInputProps,
  | 'autoCapitalize'
  | 'autoComplete'
  | 'autoFocus'
  | 'inputMode'
  | 'maxLength'
  | 'onBlur'
  | 'onSubmitEditing'
  | 'placeholder'
  | 'secureTextEntry'
  | 'enterKeyHint'
  | 'spellCheck'
>

export interface FieldProps extends FieldWords, Typing {
  value: string
  onChangeText: (text: string) => void
  /** A unit or sign before ("$") or after ("in") what is typed; also read out with the hint. */
  prefix?: string
  suffix?: string
  isDisabled?: boolean
}

export function Field({
  label,
  hint,
  error,
  isOptional,
  fieldId,
  prefix,
  suffix,
  isDisabled,
  ...typing
}: FieldProps) {
  return (
    <FieldFrame label={label} hint={hint} error={error} isOptional={isOptional} fieldId={fieldId}>
      {(control) => (
        <View style={styles.row}>
          {prefix ? <Affix text={prefix} side="before" /> : null}
          <TextInput
            {...typing}
            {...control}
            editable={!isDisabled}
            placeholderTextColor={color.muted}
            style={[
              controlStyles.box,
              styles.input,
              prefix ? styles.afterPrefix : null,
              suffix ? styles.beforeSuffix : null,
              error ? controlStyles.refused : null,
              isDisabled ? controlStyles.off : null,
            ]}
          />
          {suffix ? <Affix text={suffix} side="after" /> : null}
        </View>
      )}
    </FieldFrame>
  )
}

function Affix({ text, side }: { text: string; side: 'before' | 'after' }) {
  return (
    <View style={[styles.affix, side === 'before' ? styles.before : styles.after]}>
      <Text tint="muted">{text}</Text>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'stretch' },
  input: { flex: 1, minWidth: 0 },
  affix: {
    justifyContent: 'center',
    paddingHorizontal: space.md,
    backgroundColor: color.sunk,
    borderWidth: 1,
    borderColor: color.edge,
  },
  before: { borderRightWidth: 0, borderTopLeftRadius: radius.tag, borderBottomLeftRadius: radius.tag },
  after: { borderLeftWidth: 0, borderTopRightRadius: radius.tag, borderBottomRightRadius: radius.tag },
  afterPrefix: { borderTopLeftRadius: 0, borderBottomLeftRadius: 0 },
  beforeSuffix: { borderTopRightRadius: 0, borderBottomRightRadius: 0 },
})
