import { StyleSheet, TextInput } from 'react-native'

import { controlStyles } from './control-look'
import { FieldFrame, type FieldWords } from './field-frame'
import { Text } from './text'

import { color, type } from '@/constants/theme'

interface Props extends FieldWords {
  value: string
  onChangeText: (text: string) => void
  onBlur?: () => void
  rows?: number
  maxLength?: number
  placeholder?: string
  isDisabled?: boolean
}

export function TextArea({
  value,
  onChangeText,
  onBlur,
  rows = 4,
  maxLength,
  placeholder,
  isDisabled,
  ...words
}: Props) {
  return (
    <FieldFrame {...words}>
      {(control) => (
        <>
          <TextInput
            {...control}
            multiline
            value={value}
            onChangeText={onChangeText}
            onBlur={onBlur}
            maxLength={maxLength}
            placeholder={placeholder}
            placeholderTextColor={color.muted}
            editable={!isDisabled}
            style={[
              controlStyles.box,
              styles.area,
              { minHeight: rows * type.body.lineHeight + 18 },
              words.error ? controlStyles.refused : null,
              isDisabled ? controlStyles.off : null,
            ]}
          />
          {maxLength ? (
            <Text size="small" tint="muted" isFigures style={styles.count}>
              {`${value.length} of ${maxLength} characters`}
            </Text>
          ) : null}
        </>
      )}
    </FieldFrame>
  )
}

const styles = StyleSheet.create({ area: { textAlignVertical: 'top' }, count: { alignSelf: 'flex-end' } })
