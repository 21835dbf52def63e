import { readFile } from 'node:fs/promises'

import sharp from 'sharp'

// Draws every picture of the mark from public/icon.svg. Run: node --import tsx seed/icons/draw-icons.ts
const mark = await readFile('public/icon.svg')
const mist = '#f1f4f8'

interface Picture {
  sizePx: number
  /** The mark's width as a share of the picture. */
  markShare: number
  ground?: string
}

async function draw(file: string, { sizePx, markShare, ground }: Picture) {
  const inner = Math.round(sizePx * markShare)
  const picture = await sharp(mark, { density: (72 * inner) / 64 })
    .resize(inner, inner)
    .png()
    .toBuffer()
  const background = ground ?? { r: 0, g: 0, b: 0, alpha: 0 }
  await sharp({ create: { width: sizePx, height: sizePx, channels: 4, background } })
    .composite([{ input: picture, gravity: 'centre' }])
    .png({ compressionLevel: 9, palette: true })
    .toFile(file)
  console.log(file)
}

await draw('assets/images/icon.png', { sizePx: 1024, markShare: 0.75, ground: mist })
await draw('assets/images/favicon.png', { sizePx: 48, markShare: 1 })
await draw('public/icon-192.png', { sizePx: 192, markShare: 0.8, ground: mist })
await draw('public/icon-512.png', { sizePx: 512, markShare: 0.8, ground: mist })
await draw('public/icon-maskable-512.png', { sizePx: 512, markShare: 0.6, ground: mist })
