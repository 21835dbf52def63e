import { PICTURE } from '@/seed/pictures/draw-ground'
import type { Point } from '@/seed/pictures/smooth-path'
import type { VesselKind } from '@/seed/pictures/picture-plan.facts'

/** Where animals may be drawn: a round or a rectangular patch of water. */
export interface Water {
  isRound: boolean
  cx: number
  cy: number
  /** Half the width and half the height. */
  rx: number
  ry: number
}

export interface Vessel {
  water: Water
  /** Drawn beneath the animals. */
  below: string
  /** Drawn over them. */
  above: string
}

const cx = PICTURE.widthPx / 2
const HERE: Point = [0, 0]
const SHADOW: Point = [16, 22]
const glint = (x: number, y: number, reach: number) =>
  `<path d="M${x} ${y}q${reach * 0.5} ${-reach * 0.18} ${reach} 0" fill="none" stroke="#ffffff" stroke-opacity="0.5" stroke-width="7" stroke-linecap="round"/>`

function round(radius: number, [shade, rim, inside, water]: readonly string[]): Vessel {
  const cy = 380
  const circle = (r: number, fill: string, [dx, dy]: Point = HERE) =>
    `<circle cx="${cx + dx}" cy="${cy + dy}" r="${r}" fill="${fill}"/>`
  return {
    water: { isRound: true, cx, cy, rx: radius - 66, ry: radius - 66 },
    below: `<g opacity="0.28">${circle(radius, shade ?? '', SHADOW)}</g>${circle(radius, rim ?? '')}${circle(radius - 22, inside ?? '')}${circle(radius - 46, water ?? '')}`,
    above:
      glint(cx - radius * 0.5, cy - radius * 0.48, 150) +
      glint(cx + radius * 0.18, cy + radius * 0.56, 120) +
      glint(cx - radius * 0.44, cy - radius * 0.38, 70),
  }
}

function oblong([halfX, halfY]: readonly [number, number], [rim, inside, water]: readonly string[]): Vessel {
  const cy = 370
  const box = (inset: number, fill: string, [dx, dy]: Point = HERE) =>
    `<rect x="${cx - halfX + inset + dx}" y="${cy - halfY + inset + dy}" width="${2 * (halfX - inset)}" height="${2 * (halfY - inset)}" rx="${56 - inset * 0.5}" fill="${fill}"/>`
  return {
    water: { isRound: false, cx, cy, rx: halfX - 74, ry: halfY - 70 },
    below: `<g opacity="0.28">${box(0, '#14181f', SHADOW)}</g>${box(0, rim ?? '')}${box(20, inside ?? '')}${box(48, water ?? '')}`,
    above: glint(cx - halfX * 0.72, cy - halfY * 0.58, 170) + glint(cx + halfX * 0.26, cy + halfY * 0.6, 130),
  }
}

function net(): Vessel {
  const [cy, radius] = [370, 318]
  const mesh = Array.from({ length: 33 }, (_, at) => {
    const shift = (at - 16) * 22
    return `<path d="M${cx + shift - 330} ${cy - 330}l660 660M${cx + shift + 330} ${cy - 330}l-660 660"/>`
  }).join('')
  return {
    water: { isRound: true, cx, cy, rx: radius - 60, ry: radius - 60 },
    below: `<clipPath id="hoop"><circle cx="${cx}" cy="${cy}" r="${radius}"/></clipPath><path d="M${cx + 210} ${cy - 236}L${cx + 560} ${cy - 520}" stroke="#7c5a34" stroke-width="40" stroke-linecap="round"/>
      <circle cx="${cx + 14}" cy="${cy + 20}" r="${radius}" fill="#14181f" opacity="0.26"/><circle cx="${cx}" cy="${cy}" r="${radius}" fill="#dce8e2"/>
      <g clip-path="url(#hoop)" stroke="#b3c8bf" stroke-width="3">${mesh}</g><circle cx="${cx}" cy="${cy}" r="${radius}" fill="none" stroke="#2c5f49" stroke-width="20"/>`,
    above: '',
  }
}

/** Seen from the front: fish show their sides. */
function viewingBox(): Vessel {
  const [left, top, width, height, surface] = [96, 96, 928, 560, 176]
  return {
    water: { isRound: false, cx, cy: 395, rx: width / 2 - 50, ry: 180 },
    below: `<rect x="${left + 18}" y="${top + 26}" width="${width}" height="${height}" rx="10" fill="#14181f" opacity="0.26"/>
      <rect x="${left}" y="${top}" width="${width}" height="${height}" rx="10" fill="#f3f6f4"/><rect x="${left}" y="${surface}" width="${width}" height="${top + height - surface}" fill="#d3e6e6"/>
      <rect x="${left}" y="${surface}" width="${width}" height="9" fill="#a9cccf"/><rect x="${left}" y="612" width="${width}" height="44" fill="#c2dadb"/>`,
    above: `<path d="M${left + 52} ${surface + 34}L${left + 30} 560M${left + 84} ${surface + 34}L${left + 74} 400" stroke="#ffffff" stroke-opacity="0.7" stroke-width="10" stroke-linecap="round"/>
      <rect x="${left}" y="${top}" width="${width}" height="${height}" rx="10" fill="none" stroke="#4a5868" stroke-width="15"/>`,
  }
}

const vessels: Record<VesselKind, () => Vessel> = {
  'viewing-box': viewingBox,
  'white-pan': () => round(338, ['#14181f', '#fdfdfb', '#e3e8e6', '#cfe2e0']),
  'grey-bucket': () => round(330, ['#14181f', '#5b646d', '#3f474f', '#7e989c']),
  'blue-tub': () => oblong([452, 308], ['#2d5b98', '#4477b8', '#9cc3de']),
  'black-tray': () => oblong([470, 292], ['#23282f', '#323941', '#5c717a']),
  net,
}

export function drawVessel(kind: VesselKind): Vessel {
  return vessels[kind]()
}
