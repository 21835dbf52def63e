import { crc32, deflateSync } from 'node:zlib'

import sharp from 'sharp'

/** A photo of nothing in particular: two fields of colour, so that it has an average and an outline. */
export async function plainPhoto(size: { width: number; height: number }): Promise<Buffer> {
  const half = { width: Math.ceil(size.width / 2), height: size.height, channels: 3 as const }
  const right = await sharp({ create: { ...half, background: '#203060' } })
    .png()
    .toBuffer()
  return sharp({ create: { ...size, channels: 3, background: '#c8e356' } })
    .composite([{ input: right, left: Math.floor(size.width / 2), top: 0 }])
    .jpeg()
    .toBuffer()
}

/** As a telephone writes it: turned on its side, dated, and with the place where it was taken. */
export async function telephonePhoto(size: { width: number; height: number }): Promise<Buffer> {
  return sharp(await plainPhoto(size))
    .withMetadata({ orientation: 6 })
    .withExif({
      IFD0: { Make: 'Handheld', ImageDescription: 'SECRET-PLACE', Orientation: '6' },
      IFD2: { DateTimeOriginal: '2027:01:12 07:41:09' },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '39/1 6/1 1400/100',
        GPSLongitudeRef: 'W',
        GPSLongitude: '84/1 30/1 4600/100',
      },
    })
    .jpeg()
    .toBuffer()
}

function chunk(name: string, body: Buffer): Buffer {
  const named = Buffer.concat([Buffer.from(name, 'latin1'), body])
  const size = Buffer.alloc(4)
  size.writeUInt32BE(body.length)
  const check = Buffer.alloc(4)
  check.writeUInt32BE(crc32(named))
  return Buffer.concat([size, named, check])
}

/** A PNG of a few kilobytes that unfolds to width × height pixels. */
export function pngBomb(width: number, height: number): Buffer {
  const head = Buffer.alloc(13)
  head.writeUInt32BE(width, 0)
  head.writeUInt32BE(height, 4)
  head.set([1, 0, 0, 0, 0], 8)
  const rows = Buffer.alloc((1 + Math.ceil(width / 8)) * height)
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])
  return Buffer.concat([
    signature,
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(rows)),
    chunk('IEND', Buffer.alloc(0)),
  ])
}

export const svgWithScript = Buffer.from(
  '<svg xmlns="http://www.w3.org/2000/svg" width="10" height="10"><script>alert(1)</script></svg>',
)
