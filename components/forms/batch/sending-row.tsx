import { StyleSheet, View } from 'react-native'

import { Button } from '@/components/ui/button'
import { FieldError } from '@/components/ui/field-frame'
import { Photo } from '@/components/ui/photo'
import { Progress } from '@/components/ui/progress'
import { color, radius, space } from '@/constants/theme'

import type { SendingPhoto } from '@/hooks/use-photos'

interface Props {
  sending: SendingPhoto
  onRetry: () => void
  onRemove: () => void
}

/** A photo on its way, or one that did not arrive: it waits here with its reason, everything else goes on. */
export function SendingRow({ sending, onRetry, onRemove }: Props) {
  const { photo, fraction, problem } = sending
  return (
    <View role="group" aria-label={`Photo ${photo.name}`} style={styles.row}>
      <View style={styles.picture}>
        <Photo uri={photo.uri} label={photo.name} ratio={1} />
      </View>
      <View style={styles.words}>
        {problem ? (
          <>
            <FieldError id={`sending-${sending.key}`} error={problem} />
            <View style={styles.acts}>
              <Button
                kind="secondary"
                label="Try again"
                spokenLabel={`Try again: ${photo.name}`}
                onPress={onRetry}
              />
              <Button kind="quiet" label="Remove" spokenLabel={`Remove ${photo.name}`} onPress={onRemove} />
            </View>
          </>
        ) : (
          <Progress
            label={photo.name}
            fraction={fraction}
            valueText={fraction < 1 ? `${Math.round(fraction * 100)} %` : 'Being made smaller'}
          />
        )}
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
    borderStyle: 'dashed',
    borderColor: color.edge,
  },
  picture: { width: 88 },
  words: { flex: 1, minWidth: 0, gap: space.sm, justifyContent: 'center' },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
