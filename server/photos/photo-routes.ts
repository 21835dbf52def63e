import { Router } from 'express'

import { on } from '@/server/http/on'
import { uploadPhoto } from '@/server/photos/upload-photo'
import { Problem } from '@/shared/api/problem'
import { uploadPhoto as uploadPhotoCall } from '@/shared/contracts/photos'

export function photoRoutes(): Router {
  const router = Router()
  on(
    router,
    uploadPhotoCall,
  )(async ({ caller, file }) => {
    if (!file) throw new Problem('body-unreadable')
    return uploadPhoto(caller, file)
  })
  return router
}
