import { useFormContext, useFormState, useWatch } from 'react-hook-form'
import { StyleSheet, View } from 'react-native'

import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundDay } from '@/components/forms/bound/bound-day'
import { BoundText } from '@/components/forms/bound/bound-text'
import { fieldIdOf } from '@/components/forms/field-id'
import { Button } from '@/components/ui/button'
import { FieldError } from '@/components/ui/field-frame'
import { Photo } from '@/components/ui/photo'
import { color, radius, space } from '@/constants/theme'
import { photoUrl } from '@/hooks/api'
import { useBreakpoint } from '@/hooks/use-breakpoint'

import type { BatchTyping } from './batch-typing'

interface Props {
  at: number
  onRemove: () => void
}

export function PhotoRow({ at, onRemove }: Props) {
  const isPhone = useBreakpoint() === 'phone'
  const photo = useWatch<BatchTyping, `photos.${number}`>({ name: `photos.${at}` })
  const { errors } = useFormState<BatchTyping>({ name: `photos.${at}` })
  const { trigger } = useFormContext<BatchTyping>()
  const fault = errors.photos?.[at]?.photoId?.message
  const pictureId = fieldIdOf(`photos.${at}.photoId`)
  return (
    <View role="group" aria-label={`Photo ${at + 1}`} style={[styles.row, isPhone ? styles.stacked : null]}>
      <View nativeID={pictureId} tabIndex={-1} style={isPhone ? styles.above : styles.beside}>
        <Photo
          uri={photoUrl(photo.photoId, isPhone ? 800 : 320)}
          label={photo.caption || `Photo ${at + 1} of this batch`}
          ratio={isPhone ? 1.6 : 1}
        />
      </View>
      <View style={styles.words}>
        {fault ? <FieldError id={`${pictureId}-error`} error={fault} /> : null}
        <BoundCheck<BatchTyping>
          name={`photos.${at}.hasRuler`}
          label="A ruler lies beside the fish"
          onChosen={() => void trigger('photos')}
        />
        <BoundDay<BatchTyping> name={`photos.${at}.takenOn`} label="Taken on" />
        <BoundText<BatchTyping>
          name={`photos.${at}.caption`}
          label="What it shows"
          isOptional
          maxLength={120}
          placeholder="Ten fish in a white pail"
        />
        <Button
          kind="quiet"
          icon="trash"
          label="Remove"
          spokenLabel={`Remove photo ${at + 1}`}
          onPress={onRemove}
          style={styles.remove}
        />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    gap: space.lg,
    padding: space.md,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
  },
  stacked: { flexDirection: 'column' },
  above: { width: '100%' },
  beside: { width: 168 },
  words: { flex: 1, minWidth: 0, gap: space.md },
  remove: { marginLeft: -space.md },
})
