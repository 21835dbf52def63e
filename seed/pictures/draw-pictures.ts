import { mkdir } from 'node:fs/promises'

import sharp from 'sharp'

import { drawGoods } from '@/seed/pictures/draw-goods'
import { drawPicture } from '@/seed/pictures/draw-picture'
import { goodsPlans } from '@/seed/pictures/goods-plan.facts'
import { picturePlans } from '@/seed/pictures/picture-plan.facts'

/** Wide enough for the largest place a photo is shown at on a phone, small enough to keep. */
const WIDTH_PX = 800

// Draws the demo's photos anew. Run: node --import tsx seed/pictures/draw-pictures.ts
await mkdir('assets/demo', { recursive: true })
const drawings = [
  ...picturePlans.map((plan) => ({ name: plan.name, svg: drawPicture(plan) })),
  ...goodsPlans.map((plan) => ({ name: plan.name, svg: drawGoods(plan) })),
]
for (const { name, svg } of drawings) {
  const file = `assets/demo/${name}.webp`
  const { size } = await sharp(Buffer.from(svg))
    .resize({ width: WIDTH_PX })
    .webp({ quality: 82, effort: 6 })
    .toFile(file)
  console.log(`${file} ${Math.round(size / 1024)} kB`)
}
