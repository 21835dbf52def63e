import type { FishLook } from '@/seed/pictures/fish-look.facts'
import { cornerPath, smoothPath, type Point } from '@/seed/pictures/smooth-path'
import type { Chance } from '@/seed/seeded-random'

/** Where along the body the widths below are given: nose 0, root of the tail 0.84. */
const STATIONS = [0, 0.03, 0.1, 0.2, 0.35, 0.5, 0.65, 0.77, 0.84] as const
const widths = {
  deep: [0.05, 0.28, 0.58, 0.86, 1, 0.9, 0.64, 0.37, 0.3],
  long: [0.06, 0.3, 0.56, 0.82, 1, 0.94, 0.72, 0.46, 0.36],
  whiskered: [0.2, 0.5, 0.78, 0.95, 1, 0.84, 0.6, 0.42, 0.34],
} as const

/** Half the depth of the body at a share of its length. */
function depthAt(look: FishLook, share: number): number {
  const found = STATIONS.findIndex((station) => station >= share)
  const to = Math.max(1, found === -1 ? STATIONS.length - 1 : found)
  const [low = 0, high = 1] = [STATIONS[to - 1], STATIONS[to]]
  const [from = 0, until = 0] = [widths[look.build][to - 1], widths[look.build][to]]
  return from + ((until - from) * (share - low)) / (high - low)
}

const upper = (look: FishLook, share: number) => -look.above * depthAt(look, share)
const lower = (look: FishLook, share: number) => look.below * depthAt(look, share)

function bodyOutline(look: FishLook, length: number): Point[] {
  const top = STATIONS.map((share): Point => [share * length, upper(look, share) * length])
  const bottom = STATIONS.map((share): Point => [share * length, lower(look, share) * length])
  return [...top, ...bottom.slice(1).toReversed()]
}

const tails = {
  forked: [
    [0.8, -0.05],
    [1, -0.15],
    [0.93, 0],
    [1, 0.15],
    [0.8, 0.05],
  ],
  square: [
    [0.8, -0.05],
    [0.97, -0.12],
    [0.96, 0],
    [0.97, 0.12],
    [0.8, 0.05],
  ],
  flowing: [
    [0.8, -0.05],
    [1.08, -0.17],
    [0.98, 0],
    [1.06, 0.17],
    [0.8, 0.05],
  ],
} as const satisfies Record<FishLook['tail'], Point[]>

function finsOf(look: FishLook, length: number): string {
  const path = (points: Point[]) =>
    `<path d="${cornerPath(points)}" fill="${look.fins}" stroke="${look.fins}"/>`
  const onBack = look.backFins.map(([from, to, height]) => {
    const spines = look.isSpiny ? 7 : 2
    const crest = Array.from({ length: spines + 1 }, (_, at): Point => {
      const share = from + ((to - from) * at) / spines
      const rise =
        height * Math.sin(Math.PI * (0.25 + (0.6 * at) / spines)) * (at % 2 === 0 && look.isSpiny ? 0.82 : 1)
      return [share * length, (upper(look, share) - rise) * length]
    })
    return path([[from * length, 0], ...crest, [to * length, 0]])
  })
  const under = ([from, to, drop]: [number, number, number]) =>
    path([
      [from * length, 0],
      [(from + 0.05) * length, (lower(look, from) + drop) * length],
      [to * length, (lower(look, to) + drop * 0.5) * length],
      [to * length, 0],
    ])
  const tail = path(tails[look.tail].map(([x, y]): Point => [x * length, y * length]))
  return [tail, ...onBack, under([0.58, 0.74, 0.07]), under([0.33, 0.42, 0.06])].join('')
}

const marks: Record<FishLook['mark'], (look: FishLook, length: number, chance: Chance) => string> = {
  plain: () => '',
  bars: (look, length) =>
    [0.28, 0.38, 0.48, 0.58, 0.68, 0.77]
      .map((share) => {
        const [x, width] = [share * length, 0.035 * length]
        return `<rect x="${x}" y="${-0.3 * length}" width="${width}" height="${0.42 * length}" rx="${width / 2}" fill="${look.markColour}"/>`
      })
      .join(''),
  saddles: (look, length) =>
    [0.26, 0.36, 0.46, 0.56, 0.66, 0.75]
      .map((share) => {
        const corners: Point[] = [
          [share - 0.035, -0.2],
          [share + 0.035, -0.2],
          [share + 0.004, 0.06],
          [share - 0.004, 0.06],
        ]
        return `<path d="${cornerPath(corners.map(([x, y]): Point => [x * length, y * length]))}" fill="${look.markColour}"/>`
      })
      .join(''),
  stripe: (look, length) => {
    const blots = [0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.79]
    return blots
      .map(
        (share, at) =>
          `<ellipse cx="${share * length}" cy="${-0.005 * length}" rx="${0.055 * length}" ry="${(at % 2 ? 0.02 : 0.028) * length}" fill="${look.markColour}"/>`,
      )
      .join('')
  },
  lines: (look, length) =>
    [-0.09, -0.06, -0.03, 0, 0.03, 0.06]
      .map(
        (y) =>
          `<path d="M${0.24 * length} ${y * length}Q${0.5 * length} ${(y * 1.2 + 0.012) * length} ${0.84 * length} ${y * 0.4 * length}" fill="none" stroke="${look.markColour}" stroke-width="${0.011 * length}" stroke-dasharray="${0.13 * length} ${0.012 * length}"/>`,
      )
      .join(''),
  spots: (look, length, chance) => dots({ look, length, chance, count: 16, colour: look.markColour }),
  band: (look, length, chance) =>
    `<path d="M${0.17 * length} ${-0.012 * length}H${0.84 * length}V${0.022 * length}H${0.17 * length}Z" fill="${look.markColour}"/>` +
    dots({ look, length, chance, count: 26, colour: look.second ?? look.markColour }),
  patches: (look, length, chance) =>
    [0.14, 0.42, 0.68]
      .map((share, at) => {
        const fill = at === 1 && chance.happens(0.5) ? (look.second ?? look.markColour) : look.markColour
        return `<ellipse cx="${share * length}" cy="${-0.07 * length}" rx="${chance.between(0.08, 0.13) * length}" ry="${0.1 * length}" fill="${fill}"/>`
      })
      .join(''),
}

function dots(of: { look: FishLook; length: number; chance: Chance; count: number; colour: string }): string {
  const { look, length, chance, count, colour } = of
  return Array.from({ length: count }, () => {
    const share = chance.between(0.22, 0.82)
    const y = chance.between(upper(look, share) * 0.85, lower(look, share) * 0.2)
    return `<circle cx="${share * length}" cy="${y * length}" r="${0.008 * length}" fill="${colour}"/>`
  }).join('')
}

function faceOf(look: FishLook, length: number): string {
  const eye = look.build === 'whiskered' ? 0.016 : 0.024
  const whiskers =
    look.build === 'whiskered'
      ? [
          [-0.02, -0.12],
          [0.03, 0.14],
          [0.05, 0.1],
        ]
          .map(
            ([y = 0, reach = 0]) =>
              `<path d="M${0.03 * length} ${y * length}q${-0.05 * length} ${reach * 0.5 * length} ${-0.02 * length} ${reach * length}" fill="none" stroke="${look.back}" stroke-width="${0.01 * length}" stroke-linecap="round"/>`,
          )
          .join('')
      : ''
  const spot =
    look.second && look.mark === 'bars'
      ? `<circle cx="${0.235 * length}" cy="${-0.045 * length}" r="${0.03 * length}" fill="${look.second}"/>`
      : ''
  return `<path d="M${0.2 * length} ${-0.08 * length}q${0.045 * length} ${0.08 * length} 0 ${0.15 * length}" fill="none" stroke="${look.back}" stroke-width="${0.011 * length}"/>${spot}
    <path d="M${0.005 * length} ${0.012 * length}l${0.055 * length} ${0.018 * length}" stroke="${look.back}" stroke-width="${0.01 * length}" stroke-linecap="round"/>
    <circle cx="${0.09 * length}" cy="${-0.035 * length}" r="${eye * length}" fill="#fdf6e3"/><circle cx="${0.087 * length}" cy="${-0.035 * length}" r="${eye * 0.6 * length}" fill="#14181f"/>
    <path d="${cornerPath(
      [
        [0.24, 0.02],
        [0.34, 0.05],
        [0.33, 0.09],
        [0.25, 0.06],
      ].map(([x = 0, y = 0]): Point => [x * length, y * length]),
    )}" fill="${look.fins}" opacity="0.9"/>${whiskers}`
}

/** One fish from the side, nose at the origin and tail to the right, `length` long from end to end. */
export function drawFish(look: FishLook, length: number, chance: Chance): string {
  const outline = smoothPath(bodyOutline(look, length))
  const id = `body${Math.round(chance.next() * 1e9)}`
  const back = `M0 ${-0.03 * length}Q${0.4 * length} ${-0.09 * length} ${0.84 * length} ${-0.015 * length}V${-length}H0Z`
  const belly = `M0 ${0.045 * length}Q${0.4 * length} ${0.1 * length} ${0.84 * length} ${0.02 * length}V${length}H0Z`
  return `${finsOf(look, length)}<clipPath id="${id}"><path d="${outline}"/></clipPath><path d="${outline}" fill="${look.flank}"/>
    <g clip-path="url(#${id})"><path d="${back}" fill="${look.back}"/><path d="${belly}" fill="${look.belly}"/>${marks[look.mark](look, length, chance)}</g>${faceOf(look, length)}`
}
