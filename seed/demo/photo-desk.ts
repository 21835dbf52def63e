import { randomUUID } from 'node:crypto'
import { mkdtemp, rm, stat } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

import sharp from 'sharp'

import type { LotPlan, Shot } from '@/seed/demo/batch-plan'
import { seededRandom } from '@/seed/seeded-random'
import type { Caller } from '@/server/http/caller'
import { uploadPhoto } from '@/server/photos/upload-photo'

const PICTURES = path.join(path.dirname(fileURLToPath(import.meta.url)), '..', '..', 'assets', 'demo')
const LANES = 2

/** Framed and lit a little differently each time, as photos of one pan are, so that no two look the same to a machine. */
async function frame(shot: Shot, file: string): Promise<void> {
  const chance = seededRandom(`frame ${shot.framing}`)
  const source = sharp(path.join(PICTURES, `${shot.picture}.webp`))
  const { width, height } = await source.metadata()
  const zoom = chance.between(0.88, 0.96)
  const [cut, cutHigh] = [Math.round(width * zoom), Math.round(height * zoom)]
  const light = chance.between(0.9, 1.08)
  const warmth = chance.between(-0.05, 0.05)
  const picture = source
    .extract({
      left: Math.floor((width - cut) * chance.between(0.25, 0.75)),
      // The ruler lies at the foot: what is cut off is cut from above.
      top: Math.floor((height - cutHigh) * chance.between(0.6, 1)),
      width: cut,
      height: cutHigh,
    })
    .linear([light * (1 + warmth), light, light * (1 - warmth)], [0, 0, 0])
  const dated = shot.cameraDay
    ? picture.withExif({ IFD0: { DateTime: `${shot.cameraDay.replaceAll('-', ':')} 10:15:00` } })
    : picture
  await dated.jpeg({ quality: 90 }).toFile(file)
}

export interface PhotoDesk {
  /** Ids of a batch's photos, in order, once they are uploaded. */
  photosOf: (key: string) => Promise<string[]>
  count: () => number
  close: () => Promise<void>
}

/** Takes and uploads the photos of all batches through the product's own upload, two at a time, in the given order. */
export async function openPhotoDesk(plans: readonly LotPlan[]): Promise<PhotoDesk> {
  const folder = await mkdtemp(path.join(tmpdir(), 'tankward-demo-photos-'))
  let taken = 0
  const take = async (shot: Shot, caller: Caller): Promise<string> => {
    const file = path.join(folder, `${randomUUID()}.jpg`)
    await frame(shot, file)
    const { size } = await stat(file)
    const { photoId } = await uploadPhoto(caller, {
      path: file,
      bytes: size,
      remove: () => rm(file, { force: true }),
    })
    taken++
    return photoId
  }
  const lanes: Promise<unknown>[] = Array.from({ length: LANES }, () => Promise.resolve())
  const uploads = new Map<string, Promise<string[]>>()
  plans.forEach(({ key, farm, shots }, at) => {
    const lane = at % LANES
    const upload = (lanes[lane] ?? Promise.resolve()).then(async () => {
      const ids: string[] = []
      for (const shot of shots) ids.push(await take(shot, farm.owner.caller))
      return ids
    })
    // Whoever waits for the batch is told; here the failure only must not go by unheard of.
    lanes[lane] = upload.catch(() => undefined)
    uploads.set(key, upload)
  })
  return {
    photosOf: async (key) => (await uploads.get(key)) ?? [],
    count: () => taken,
    close: async () => {
      await Promise.all(lanes)
      await rm(folder, { recursive: true, force: true })
    },
  }
}
