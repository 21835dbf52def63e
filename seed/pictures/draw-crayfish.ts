import type { Point } from '@/seed/pictures/smooth-path'
import type { Chance } from '@/seed/seeded-random'

interface ShellLook {
  shell: string
  dark: string
  patch: string
  feeler: string
  isPrawn: boolean
}

// prettier-ignore
export const shellLooks: Partial<Record<string, ShellLook>> = {
  redclaw_crayfish: { shell: '#3f7d84', dark: '#27545c', patch: '#d2452f', feeler: '#b9643c', isPrawn: false },
  freshwater_prawn: { shell: '#a9c0c4', dark: '#6f929b', patch: '#3f6fa6', feeler: '#6f929b', isPrawn: true },
}

const oval = ([cx, cy]: Point, [rx, ry]: Point, fill: string) =>
  `<ellipse cx="${cx}" cy="${cy}" rx="${rx}" ry="${ry}" fill="${fill}"/>`
const line = (d: string, stroke: string, width: number) =>
  `<path d="${d}" fill="none" stroke="${stroke}" stroke-width="${width}" stroke-linecap="round" stroke-linejoin="round"/>`

/** Legs, arms and feelers of one side; `side` is -1 or 1. */
function limbs({ shell, dark, patch, feeler, isPrawn }: ShellLook, length: number, side: number): string {
  const at = (share: number) => share * length
  const legs = [0.02, 0.08, 0.14].map((x, n) =>
    line(
      `M${at(x)} ${side * at(0.06)}l${at(0.03 + n * 0.02)} ${side * at(0.11)}l${at(0.05)} ${side * at(0.05)}`,
      dark,
      at(0.014),
    ),
  )
  const feelers = line(
    `M${at(-0.2)} ${side * at(0.02)}q${at(-0.22)} ${side * at(0.06)} ${at(-0.18)} ${side * at(0.3)}`,
    feeler,
    at(0.006),
  )
  const arm = `M${at(-0.13)} ${side * at(0.05)}l${at(-0.06)} ${side * at(0.12)}l${at(-0.12)} ${side * at(0.02)}`
  if (isPrawn)
    return `${legs.join('')}${feelers}${line(`${arm}l${at(-0.16)} ${-side * at(0.05)}`, patch, at(0.014))}`
  const claw = `<g transform="translate(${at(-0.31)} ${side * at(0.19)}) rotate(${side * 168}) scale(1 ${side})">
    <path d="M${at(-0.03)} 0C0 ${at(-0.09)} ${at(0.12)} ${at(-0.08)} ${at(0.21)} ${at(-0.015)}L${at(0.1)} ${at(0.005)}L${at(0.19)} ${at(0.03)}C${at(0.1)} ${at(0.07)} 0 ${at(0.05)} ${at(-0.03)} 0Z" fill="${shell}"/>
    <path d="M${at(0.03)} ${at(-0.055)}C${at(0.08)} ${at(-0.08)} ${at(0.13)} ${at(-0.065)} ${at(0.17)} ${at(-0.035)}L${at(0.09)} ${at(-0.03)}Z" fill="${patch}"/></g>`
  return `${legs.join('')}${feelers}${line(arm, dark, at(0.035))}${claw}`
}

/** One crayfish or prawn from above, head to the left, `length` from head to tail fan. */
export function drawCrayfish(look: ShellLook, length: number, chance: Chance): string {
  const at = (share: number) => share * length
  const { shell, dark, patch, isPrawn } = look
  const slim = isPrawn ? 0.72 : 1
  const curl = chance.between(-0.05, 0.05)
  const bend = (step: number) => at(curl * step * step * 0.12)
  const rings = [5, 4, 3, 2, 1, 0].map((n) => {
    const width = (0.105 - n * 0.011) * slim
    return `${oval([at(0.13 + n * 0.055), bend(n)], [at(0.042), at(width)], n % 2 === 0 ? shell : dark)}`
  })
  const fan = [-2, -1, 0, 1, 2].map(
    (n) =>
      `<g transform="translate(${at(0.44)} ${bend(6)}) rotate(${n * 24})">${oval([at(0.05), 0], [at(0.06), at(0.026)], n % 2 === 0 ? dark : isPrawn ? patch : shell)}</g>`,
  )
  const head = `<path d="M${at(0.11)} ${at(-0.1 * slim)}C${at(-0.02)} ${at(-0.15 * slim)} ${at(-0.16)} ${at(-0.1 * slim)} ${at(-0.25)} 0C${at(-0.16)} ${at(0.1 * slim)} ${at(-0.02)} ${at(0.15 * slim)} ${at(0.11)} ${at(0.1 * slim)}Z" fill="${shell}"/>`
  const seam = line(
    `M${at(-0.02)} ${at(-0.09 * slim)}q${at(-0.05)} ${at(0.09 * slim)} 0 ${at(0.18 * slim)}`,
    dark,
    at(0.012),
  )
  const eyes = [-1, 1].map((side) =>
    oval([at(-0.185), side * at(0.058 * slim)], [at(0.018), at(0.018)], '#14181f'),
  )
  return `${limbs(look, length, -1)}${limbs(look, length, 1)}${fan.join('')}${rings.join('')}${head}${seam}${eyes.join('')}`
}
