import { useFieldArray, useFormState } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { PhotoRow } from './photo-row'
import { SendingRow } from './sending-row'

import { BoundArea } from '@/components/forms/bound/bound-area'
import { fieldIdOf } from '@/components/forms/field-id'
import { FormGroup } from '@/components/forms/form-group'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { UploadButton } from '@/components/ui/upload-button'
import { space } from '@/constants/theme'

import type { BatchTyping } from './batch-typing'
import type { PhotoSending } from './use-batch-photos'

const most = 6

export function PhotosGroup({ photos }: { photos: PhotoSending }) {
  const { fields, remove } = useFieldArray<BatchTyping, 'photos'>({ name: 'photos' })
  const { errors } = useFormState<BatchTyping>({ name: 'photos' })
  const id = fieldIdOf('photos')
  const room = most - fields.length - photos.sending.length
  return (
    <FormGroup
      groupId="photos"
      title="Photos"
      intro="Of this batch, one of them with a ruler beside the fish. Place data in a photo is removed when it arrives."
    >
      <View role="group" aria-label="Photos of this batch" nativeID={id} tabIndex={-1} style={styles.list}>
        {fields.map((photo, at) => (
          <PhotoRow key={photo.id} at={at} onRemove={() => remove(at)} />
        ))}
        {photos.sending.map((one) => (
          <SendingRow
            key={one.key}
            sending={one}
            onRetry={() => photos.retry(one)}
            onRemove={() => photos.drop(one.key)}
          />
        ))}
        {photos.refused.map((sentence) => (
          <FieldError key={sentence} id={`${id}-refused`} error={sentence} />
        ))}
        {errors.photos?.root?.message ? (
          <FieldError id={`${id}-error`} error={errors.photos.root.message} />
        ) : null}
        {room > 0 ? (
          <UploadButton
            label={fields.length === 0 ? 'Add photos' : 'Add more photos'}
            isMany
            onPick={(files) => photos.choose(files, room)}
          />
        ) : (
          <Text size="note" tint="muted">
            Six photos are the most. Remove one to add another.
          </Text>
        )}
      </View>
      <BoundArea<BatchTyping>
        name="words"
        label="In your own words"
        hint="What should a buyer know that was not asked? No phone numbers or addresses: those come with the order."
        isOptional
        rows={3}
        maxLength={2000}
      />
    </FormGroup>
  )
}

const styles = StyleSheet.create({ list: { gap: space.md } })
