import { randomUUID } from 'node:crypto'
import { mkdirSync } from 'node:fs'
import { rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'

import type { Request, Response } from 'express'
import multer from 'multer'

import { photoLimits } from '@/shared/contracts/photos'
import { Problem } from '@/shared/api/problem'

export interface UploadedFile {
  path: string
  bytes: number
  /** Removes the temporary copy; call it in `finally`. */
  remove: () => Promise<void>
}

const folder = path.join(tmpdir(), 'tankward-uploads')
mkdirSync(folder, { recursive: true, mode: 0o700 })

// multer has no limits unless given. To disk, never to memory: several 8 MiB photos at once must not add up.
const receive = multer({
  storage: multer.diskStorage({
    destination: folder,
    filename: (_req, _file, done) => done(null, randomUUID()),
  }),
  limits: { fileSize: photoLimits.mostBytes, files: 1, fields: 20, fieldSize: 64 * 1024, parts: 30 },
}).single('file')

function asProblem(error: unknown): unknown {
  if (!(error instanceof multer.MulterError)) {
    if (error instanceof Error && /boundary|unexpected end|malformed/i.test(error.message))
      return new Problem('body-unreadable')
    return error
  }
  if (error.code === 'LIMIT_FILE_SIZE') return new Problem('too-large', 'A photo may have at most 8 MB.')
  return new Problem('body-unreadable', 'Send one photo at a time.')
}

/** Takes the one file of a multipart request off the wire. */
export async function uploadedFile(req: Request, res: Response): Promise<UploadedFile> {
  await new Promise<void>((done, fail) => {
    receive(req, res, (error: unknown) => (error ? fail(asProblem(error)) : done()))
  })
  const file = req.file
  if (!file)
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'Choose a photo.', pointer: '#/file' }],
    })
  return { path: file.path, bytes: file.size, remove: () => rm(file.path, { force: true }) }
}
