import type { FishLook } from '@/seed/pictures/fish-look.facts'
import { cornerPath, smoothPath, type Point } from '@/seed/pictures/smooth-path'
import type { Chance } from '@/seed/seeded-random'

/** Share of the length, and half the width there as a share of the widest. */
const spindle = [
  [0.02, 0.3],
  [0.07, 0.62],
  [0.16, 0.92],
  [0.28, 1],
  [0.45, 0.84],
  [0.62, 0.54],
  [0.76, 0.28],
  [0.86, 0.13],
] as const
const halfWidths = { deep: 0.082, long: 0.088, whiskered: 0.105 } as const

interface Swimmer {
  look: FishLook
  length: number
  /** How far the tail swings to one side, as a share of the length. */
  swing: number
}

/** A point of the bent body: `share` along it, `aside` of its middle line (share of the length). */
function place({ length, swing }: Swimmer, share: number, aside: number): Point {
  const bend = swing * Math.sin(share * Math.PI * 1.25 - 0.35) * share
  return [(share - 0.5) * length, (bend + aside) * length]
}

const BAR_HALF = 0.014

/** A dark bar across the back. */
function across(fish: Swimmer, share: number): string {
  const half = halfWidths[fish.look.build] * 0.95
  const corners = [
    place(fish, share - BAR_HALF, -half),
    place(fish, share + BAR_HALF, -half),
    place(fish, share + BAR_HALF * 0.6, half),
    place(fish, share - BAR_HALF * 0.6, half),
  ]
  return `<path d="${smoothPath(corners)}" fill="${fish.look.markColour}"/>`
}

function marksOf(fish: Swimmer, chance: Chance): string {
  const { look, length } = fish
  if (look.mark === 'bars' || look.mark === 'saddles') {
    return [0.3, 0.4, 0.5, 0.6, 0.7].map((share) => across(fish, share)).join('')
  }
  if (look.mark === 'patches') {
    return [0.16, 0.38, 0.58, 0.76]
      .filter(() => chance.happens(0.8))
      .map((share) => {
        const [x, y] = place(fish, share, chance.between(-0.03, 0.03))
        const fill = chance.happens(0.3) ? (look.second ?? look.markColour) : look.markColour
        return `<ellipse cx="${x}" cy="${y}" rx="${chance.between(0.06, 0.11) * length}" ry="${chance.between(0.05, 0.08) * length}" fill="${fill}"/>`
      })
      .join('')
  }
  if (look.mark === 'spots' || look.mark === 'band') {
    return Array.from({ length: 14 }, () => {
      const [x, y] = place(fish, chance.between(0.15, 0.75), chance.between(-0.05, 0.05))
      return `<circle cx="${x}" cy="${y}" r="${0.008 * length}" fill="${look.second ?? look.markColour}"/>`
    }).join('')
  }
  return ''
}

function finsOf(fish: Swimmer): string {
  const { look } = fish
  const fin = (points: Point[]) => `<path d="${smoothPath(points)}" fill="${look.fins}"/>`
  const half = halfWidths[look.build] * 0.8
  const pair = [-1, 1].map((side) =>
    fin([
      place(fish, 0.24, side * half),
      place(fish, 0.33, side * (half + 0.1)),
      place(fish, 0.4, side * (half + 0.085)),
      place(fish, 0.34, side * half * 0.7),
    ]),
  )
  const spread = look.tail === 'flowing' ? 0.075 : 0.03
  const end = look.tail === 'flowing' ? 1.08 : 1
  const tail = [
    place(fish, 0.82, -0.012),
    place(fish, end, -spread),
    place(fish, 0.95, 0),
    place(fish, end - 0.02, spread),
    place(fish, 0.82, 0.012),
  ]
  return `${pair.join('')}<path d="${cornerPath(tail)}" fill="${look.fins}"/>`
}

function eyesOf(fish: Swimmer): string {
  const { length } = fish
  return [-1, 1]
    .map((side) => {
      const [x, y] = place(fish, 0.09, side * 0.056)
      return `<circle cx="${x}" cy="${y}" r="${0.021 * length}" fill="#fdf6e3"/><circle cx="${x}" cy="${y}" r="${0.013 * length}" fill="#14181f"/>`
    })
    .join('')
}

function whiskersOf(fish: Swimmer): string {
  const { look, length } = fish
  if (look.build !== 'whiskered') return ''
  return [-1, 1]
    .map((side) => {
      const [x, y] = place(fish, 0.03, side * 0.04)
      return `<path d="M${x} ${y}q${-0.05 * length} ${side * 0.02 * length} ${-0.02 * length} ${side * 0.1 * length}" fill="none" stroke="${look.back}" stroke-width="${0.009 * length}" stroke-linecap="round"/>`
    })
    .join('')
}

/** One fish as it is seen in a pan, its middle at the origin, its head to the left. */
export function drawFishFromAbove(look: FishLook, length: number, chance: Chance): string {
  const fish: Swimmer = { look, length, swing: chance.between(-0.16, 0.16) }
  const side = (sign: 1 | -1, share: number) =>
    spindle.map(([at, width]) => place(fish, at, sign * width * share * halfWidths[look.build]))
  const ring = (share: number) => smoothPath([...side(-1, share), ...side(1, share).toReversed()])
  const id = `above${Math.round(chance.next() * 1e9)}`
  return `${finsOf(fish)}<clipPath id="${id}"><path d="${ring(1)}"/></clipPath><path d="${ring(1)}" fill="${look.flank}"/>
    <g clip-path="url(#${id})"><path d="${ring(0.72)}" fill="${look.back}"/>${marksOf(fish, chance)}</g>${whiskersOf(fish)}${eyesOf(fish)}`
}
