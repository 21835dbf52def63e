import { useState } from 'react'
import type { UseFormReturn } from 'react-hook-form'

import { usePhotoSending, type SendingPhoto } from '@/hooks/use-photos'
import { photoLimits } from '@/shared/contracts/photos'

import type { BatchTyping } from './batch-typing'
import type { PickedFile } from '@/components/ui/picked-file'

export interface PhotoSending {
  sending: SendingPhoto[]
  /** Why files were not taken: too large, another kind, no room. */
  refused: string[]
  choose: (files: readonly PickedFile[], room: number) => void
  retry: (sending: SendingPhoto) => void
  drop: (key: string) => void
}

const bytesPerMb = 1024 * 1024

/** Photos of one batch: sent in the background of the whole form, each added to it when it has arrived. */
export function useBatchPhotos(form: UseFormReturn<BatchTyping>, today: string): PhotoSending {
  const [refused, setRefused] = useState<string[]>([])
  const { sending, send, retry, drop } = usePhotoSending(({ photoId, takenOn }) => {
    // A camera with a wrong clock dates a photo in the future: the seller could not publish it so.
    const taken = takenOn && takenOn <= today ? takenOn : today
    const photo = { photoId, takenOn: taken, hasRuler: false, caption: '' }
    // A complaint that stands there already is looked at again; none is made before the seller has gone on.
    const shouldValidate = form.getFieldState('photos').invalid
    form.setValue('photos', [...form.getValues('photos'), photo], { shouldDirty: true, shouldValidate })
  })
  function choose(files: readonly PickedFile[], room: number) {
    const faults = files.flatMap((file) => faultOf(file) ?? [])
    const good = files.filter((file) => faultOf(file) === null)
    if (good.length > room)
      faults.push(`Six photos are the most: the last ${good.length - room} were not added.`)
    setRefused(faults)
    send(good.slice(0, room))
  }
  return { sending, refused, choose, retry, drop }
}

function faultOf(file: PickedFile): string | null {
  const kinds: readonly string[] = photoLimits.kinds
  if (!kinds.includes(file.mime)) return `${file.name} is no JPEG, PNG or WebP picture.`
  if (file.sizeBytes <= photoLimits.mostBytes) return null
  const sizeMb = Math.ceil(file.sizeBytes / bytesPerMb)
  return `${file.name} has ${sizeMb} MB; ${photoLimits.mostBytes / bytesPerMb} MB are the most.`
}
