import { useFieldArray, useFormState } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { SendingRow } from '@/components/forms/batch/sending-row'
import { fieldIdOf } from '@/components/forms/field-id'
import { FieldError } from '@/components/ui/field-frame'
import { IconButton } from '@/components/ui/icon-button'
import { Photo } from '@/components/ui/photo'
import { Text } from '@/components/ui/text'
import { UploadButton } from '@/components/ui/upload-button'
import { color, radius, space } from '@/constants/theme'
import { photoUrl } from '@/hooks/api'

import type { SupplyTyping } from './supply-typing'
import type { PhotoSending } from '@/components/forms/batch/use-batch-photos'

const most = 6

/** Photos of what is sold, each taken when it says: no ruler, no caption to type. */
export function SupplyPhotos({ photos, hint }: { photos: PhotoSending; hint: string }) {
  const { fields, remove } = useFieldArray<SupplyTyping, 'photos'>({ name: 'photos' })
  const { errors } = useFormState<SupplyTyping>({ name: 'photos' })
  const id = fieldIdOf('photos')
  const room = most - fields.length - photos.sending.length
  const fault = errors.photos?.root?.message ?? errors.photos?.message
  return (
    <View role="group" aria-labelledby={`${id}-label`} nativeID={id} tabIndex={-1} style={styles.field}>
      <View>
        <Text face="strong" nativeID={`${id}-label`}>
          Photo
        </Text>
        <Text size="note" tint="muted">
          {hint}
        </Text>
      </View>
      <View style={styles.photos}>
        {fields.map((photo, at) => (
          <View key={photo.id} role="group" aria-label={`Photo ${at + 1}`} style={styles.one}>
            <View style={styles.picture}>
              <Photo uri={photoUrl(photo.photoId, 320)} label={`Photo ${at + 1}`} ratio={1} />
            </View>
            <IconButton
              icon="trash"
              label={`Remove photo ${at + 1}`}
              tint="muted"
              onPress={() => remove(at)}
            />
          </View>
        ))}
      </View>
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
      {fault ? <FieldError id={`${id}-error`} error={fault} /> : null}
      {room > 0 ? (
        <UploadButton
          label={fields.length === 0 ? 'Take or add a photo' : 'Add another photo'}
          isMany
          onPick={(files) => photos.choose(files, room)}
        />
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  field: { gap: space.md },
  photos: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
  one: {
    flexDirection: 'row',
    alignItems: 'center',
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.tag,
    overflow: 'hidden',
  },
  picture: { width: 88 },
})
