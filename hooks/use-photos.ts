import { useState } from 'react'

import { newRequestKey } from '@/hooks/request-key'
import { sendPhoto } from '@/hooks/send-photo'
import type { UploadedPhoto } from '@/shared/contracts/photos'

/** A picture the member chose, as the upload button describes it. */
export interface ChosenPhoto {
  name: string
  sizeBytes: number
  /** For a preview only. */
  uri: string
  body: Blob
}

export interface SendingPhoto {
  key: string
  photo: ChosenPhoto
  /** 0 to 1. */
  fraction: number
  /** Why it stopped; the photo stays, to be tried again. */
  problem?: string
}

/** Sends photos one beside the other, each with its progress. A failed one waits here; nothing else is touched. */
export function usePhotoSending(onSent: (sent: UploadedPhoto) => void) {
  const [sending, setSending] = useState<SendingPhoto[]>([])
  const change = (key: string, part: Partial<SendingPhoto>) =>
    setSending((now) => now.map((one) => (one.key === key ? { ...one, ...part } : one)))
  const drop = (key: string) => setSending((now) => now.filter((one) => one.key !== key))

  async function start(key: string, photo: ChosenPhoto) {
    try {
      const sent = await sendPhoto(photo.body, (fraction) => change(key, { fraction }))
      drop(key)
      onSent(sent)
    } catch (error) {
      change(key, { problem: error instanceof Error ? error.message : 'The photo did not arrive.' })
    }
  }

  return {
    sending,
    drop,
    send: (photos: readonly ChosenPhoto[]) => {
      const begun = photos.map((photo): SendingPhoto => ({ key: newRequestKey(), photo, fraction: 0 }))
      setSending((now) => [...now, ...begun])
      for (const { key, photo } of begun) void start(key, photo)
    },
    retry: ({ key, photo }: SendingPhoto) => {
      change(key, { problem: undefined, fraction: 0 })
      void start(key, photo)
    },
  }
}
