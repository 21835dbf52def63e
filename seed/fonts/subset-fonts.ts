import { mkdir, readFile, writeFile } from 'node:fs/promises'
import { createRequire } from 'node:module'
import path from 'node:path'

import subsetFont from 'subset-font'

// Cuts the two families to what an American page needs: ASCII, Latin-1 and a few signs.
// Run: node --import tsx seed/fonts/subset-fonts.ts. Its output is committed, so a build needs no font tools.

const latin1 = Array.from({ length: 0xff - 0xa0 + 1 }, (_, step) => String.fromCodePoint(0xa0 + step)).join(
  '',
)
const ascii = Array.from({ length: 0x7e - 0x20 + 1 }, (_, step) => String.fromCodePoint(0x20 + step)).join('')
const signs = '–—‘’“”…•′″−×÷≈≤≥←→↑↓½¼¾⅓⅔⅛⅜⅝⅞€™₂₃₄₁₀⁺⁻ŒœŠšŽžŸ'
const wanted = ascii + latin1 + signs

const faces = [
  { family: 'bricolage-grotesque', weight: 600, native: 'BricolageGrotesque' },
  { family: 'bricolage-grotesque', weight: 700, native: 'BricolageGrotesque' },
  { family: 'atkinson-hyperlegible-next', weight: 400, native: 'AtkinsonHyperlegibleNext' },
  { family: 'atkinson-hyperlegible-next', weight: 600, native: 'AtkinsonHyperlegibleNext' },
] as const

const webFolder = path.resolve('public/fonts')
const nativeFolder = path.resolve('assets/fonts')
const packages = createRequire(import.meta.url)

await mkdir(webFolder, { recursive: true })
await mkdir(nativeFolder, { recursive: true })
for (const { family, weight, native } of faces) {
  const source = packages.resolve(`@fontsource/${family}/files/${family}-latin-${weight}-normal.woff2`)
  const whole = await readFile(source)
  const web = await subsetFont(whole, wanted, { targetFormat: 'woff2' })
  await writeFile(path.join(webFolder, `${family}-${weight}.woff2`), web)
  const phone = await subsetFont(whole, wanted, { targetFormat: 'truetype' })
  await writeFile(path.join(nativeFolder, `${native}-${weight}.ttf`), phone)
  console.log(`${family} ${weight}: ${whole.length} -> ${web.length} bytes`)
}
for (const family of ['bricolage-grotesque', 'atkinson-hyperlegible-next']) {
  const licence = packages.resolve(`@fontsource/${family}/LICENSE`)
  await writeFile(path.join(nativeFolder, `${family}-OFL.txt`), await readFile(licence))
}
