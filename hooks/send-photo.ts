import { photoUrl } from '@/hooks/api'
import { NoAnswer } from '@/shared/api/call'
import { isProblemSlug, Problem, type ProblemDocument } from '@/shared/api/problem'
import { routes } from '@/shared/api/routes.gen'
import type { UploadedPhoto } from '@/shared/contracts/photos'

const [method, path] = routes.uploadPhoto
// photoUrl knows the one place the API's origin is decided.
const origin = photoUrl('', 320).split('/photos/')[0] ?? ''

/** Uploads one photo. XMLHttpRequest because fetch tells nothing of how far an upload has come. */
export function sendPhoto(file: Blob, onFraction: (fraction: number) => void): Promise<UploadedPhoto> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest()
    request.open(method, `${origin}/api/v1${path}`)
    request.withCredentials = true
    request.setRequestHeader('accept', 'application/json')
    request.setRequestHeader('x-tankward', '1')
    request.upload.onprogress = (event) => {
      if (event.lengthComputable && event.total > 0) onFraction(event.loaded / event.total)
    }
    request.onerror = () => reject(new NoAnswer())
    request.ontimeout = () => reject(new NoAnswer())
    request.onload = () => {
      if (request.status === 201) resolve(JSON.parse(request.responseText) as UploadedPhoto)
      else reject(readRefusal(request))
    }
    const form = new FormData()
    form.append('file', file)
    request.send(form)
  })
}

function readRefusal(request: XMLHttpRequest): Problem {
  try {
    const told = JSON.parse(request.responseText) as ProblemDocument
    const slug = told.type.split('/').pop() ?? ''
    return new Problem(isProblemSlug(slug) ? slug : 'internal', told.detail, { facts: told.facts })
  } catch {
    return new Problem(request.status >= 500 ? 'try-again' : 'internal')
  }
}
