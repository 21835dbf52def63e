import { execFileSync } from 'node:child_process'
import { mkdtemp, readdir, readFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'

import sharp from 'sharp'
import type TestAgent from 'supertest/lib/agent'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { photo } from '@/db/schema/photos'
import { callCount } from '@/db/schema/requests'
import { buildMember } from '@/seed/build-member'
import { configurePhotos } from '@/server/photos/photo-files'
import { plainPhoto, pngBomb, svgWithScript, telephonePhoto } from '@/tests/support/pictures'
import { openTestServer, type TestServer } from '@/tests/support/server'

const MIB = 1024 * 1024

let server: TestServer
let ann: TestAgent
beforeAll(async () => {
  server = await openTestServer('upload_photo')
  await buildMember(server.db, { email: 'ann@example.org' })
  ann = await server.signedIn('ann@example.org')
})
afterAll(() => server.close())

const send = async (file: Buffer, name = 'photo.jpg') => {
  await server.db.delete(callCount)
  return ann.post('/api/v1/photos').attach('file', file, { filename: name })
}
const kept = () => readdir(server.uploadDir)
const leftInTransit = () => readdir(path.join(tmpdir(), 'tankward-uploads'))

describe('uploading a photo', () => {
  it('keeps three upright sizes, the day it was taken, and nothing else the file told', async () => {
    const { status, body } = await send(await telephonePhoto({ width: 3600, height: 2000 }))
    expect(status).toBe(201)
    // Turned upright: what was wide is now high.
    expect(body).toMatchObject({ widthPx: 1600, heightPx: 2880, takenOn: '2027-01-12' })
    expect(body.photoId).toMatch(/^[0-9a-f]{32}$/)
    expect(body.ground).toMatch(/^#[0-9a-f]{6}$/)
    for (const width of [320, 800, 1600]) {
      const file = await readFile(path.join(server.uploadDir, `${body.photoId}-${width}.webp`))
      const found = await sharp(file).metadata()
      expect(found).toMatchObject({ format: 'webp', width, height: width * 1.8 })
      expect([found.exif, found.xmp, found.iptc, found.icc, found.orientation]).toEqual(
        Array(5).fill(undefined),
      )
      for (const trace of ['SECRET-PLACE', 'Handheld', 'Exif', 'GPS'])
        expect(file.includes(trace)).toBe(false)
    }
    expect(await leftInTransit()).toEqual([])
  })

  it('serves it for a year as a picture and as nothing else', async () => {
    const { body } = await send(await plainPhoto({ width: 400, height: 300 }))
    const name = `${body.photoId}-320.webp`
    const { headers, status } = await server.visitor().get(`/photos/${name}`).set('accept', 'text/html')
    expect(status).toBe(200)
    expect(headers).toMatchObject({
      'content-type': 'image/webp',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "sandbox; default-src 'none'; frame-ancestors 'none'",
      'cache-control': 'public, max-age=31536000, immutable',
      'content-disposition': `inline; filename="${name}"`,
    })
  })

  it.each([
    '/photos/..%2f..%2fetc%2fpasswd',
    `/photos/${'a'.repeat(32)}-320.webp`,
    `/photos/${'a'.repeat(32)}-321.webp`,
    '/photos/x.svg',
  ])('has nothing at %s', async (address) => {
    const { body } = await server.visitor().get(address).expect(404)
    expect(body.type).toMatch(/^\/problems\/(not-found|no-such-path)$/)
  })

  it.each(['evil.svg', 'evil.jpg', 'evil.png', 'evil.webp'])('refuses an SVG named %s', async (name) => {
    const { status, body } = await send(svgWithScript, name)
    expect([status, body.type]).toEqual([415, '/problems/wrong-kind'])
  })

  it('refuses a picture of 400 megapixels without unfolding it', async () => {
    const bomb = pngBomb(20_000, 20_000)
    expect(bomb.length).toBeLessThan(MIB)
    const before = process.memoryUsage().rss
    const { status, body } = await send(bomb, 'bomb.png')
    expect([status, body.type]).toEqual([413, '/problems/too-large'])
    expect(process.memoryUsage().rss - before).toBeLessThan(150 * MIB)
  })

  it('takes 8 MiB and refuses one byte more', async () => {
    const jpeg = await plainPhoto({ width: 400, height: 300 })
    const padded = (bytes: number) => Buffer.concat([jpeg, Buffer.alloc(bytes - jpeg.length)])
    expect((await send(padded(8 * MIB))).status).toBe(201)
    const { status, body } = await send(padded(8 * MIB + 1))
    expect([status, body.type]).toEqual([413, '/problems/too-large'])
  })

  it.each([
    ['nothing', Buffer.alloc(0)],
    ['half a JPEG', 'half'],
    ['a GIF', Buffer.from('GIF89a\x01\x00\x01\x00\x00\x00\x00;', 'latin1')],
    ['a PDF', Buffer.from('%PDF-1.7\n1 0 obj\n<<>>\nendobj\n')],
    [
      'a JPEG’s first bytes before a page',
      Buffer.from('\xff\xd8\xff\xe0<html><script>alert(1)</script>', 'latin1'),
    ],
  ])('refuses %s', async (_, given) => {
    const file =
      given === 'half' ? (await telephonePhoto({ width: 800, height: 600 })).subarray(0, 3000) : given
    const { status, body } = await send(file as Buffer)
    expect([status, body.type]).toEqual([415, '/problems/wrong-kind'])
  })

  it('drops what hides behind the picture', async () => {
    const trailer = Buffer.from('<script>alert(document.cookie)</script>')
    const { body } = await send(Buffer.concat([await plainPhoto({ width: 400, height: 300 }), trailer]))
    for (const file of (await kept()).filter((name) => name.startsWith(body.photoId))) {
      expect((await readFile(path.join(server.uploadDir, file))).includes('<script')).toBe(false)
    }
  })

  it.each(['../../etc/cron.d/x', 'a%00.png', 'con', `${'n'.repeat(4096)}.jpg`, 'photo.php', '.htaccess'])(
    'names the file itself, whatever it was called: %.20s',
    async (name) => {
      expect((await send(await plainPhoto({ width: 40, height: 30 }), name)).status).toBe(201)
      for (const file of await kept()) expect(file).toMatch(/^[0-9a-f]{32}-(320|800|1600)\.webp$/)
    },
  )

  it('leaves no file and no row behind what it refused', async () => {
    const rows = await server.db.$count(photo)
    expect(await kept()).toHaveLength(3 * rows)
    expect(await leftInTransit()).toEqual([])
  })

  it('asks for a signed-in member, a file, and not too many an hour', async () => {
    const file = await plainPhoto({ width: 40, height: 30 })
    await server.visitor().post('/api/v1/photos').attach('file', file, 'a.jpg').expect(401)
    const none = await ann.post('/api/v1/photos').field('note', 'no file').expect(422)
    expect(none.body.errors).toEqual([{ detail: 'Choose a photo.', pointer: '#/file' }])
    await server.db.delete(callCount)
    const answers: number[] = []
    for (let n = 0; n < 31; n++) {
      answers.push((await ann.post('/api/v1/photos').attach('file', svgWithScript, 'a.svg')).status)
    }
    expect(answers.filter((status) => status === 415)).toHaveLength(30)
    const { headers } = await ann.post('/api/v1/photos').attach('file', file, 'a.jpg').expect(429)
    expect(Number(headers['retry-after'])).toBeGreaterThan(0)
  })
})

function mountSmall(folder: string): boolean {
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', 'size=64k', 'tmpfs', folder], { stdio: 'ignore' })
    return true
  } catch {
    return false
  }
}

describe('a full photo store', async () => {
  const small = await mkdtemp(path.join(tmpdir(), 'tankward-test-full-'))
  const isMounted = mountSmall(small)
  afterAll(() => {
    if (isMounted) execFileSync('umount', [small])
  })

  // Only where this process may mount: elsewhere a disk cannot be made full on purpose.
  it.runIf(isMounted)(
    'says so, keeps no half of a photo, and takes photos again when there is room',
    async () => {
      const rows = await server.db.$count(photo)
      configurePhotos({ dir: small })
      try {
        const noise = await sharp({
          create: {
            width: 1600,
            height: 1200,
            channels: 3,
            noise: { type: 'gaussian', mean: 128, sigma: 60 },
            background: '#000',
          },
        })
          .jpeg()
          .toBuffer()
        const { status, body } = await send(noise)
        expect([status, body.type]).toEqual([507, '/problems/storage-full'])
        expect(await readdir(small)).toEqual([])
        expect(await server.db.$count(photo)).toBe(rows)
        expect((await send(await plainPhoto({ width: 60, height: 40 }))).status).toBe(201)
      } finally {
        configurePhotos({ dir: server.uploadDir })
      }
    },
  )
})
