import { drawGround, PICTURE } from '@/seed/pictures/draw-ground'
import { drawVessel, type Water } from '@/seed/pictures/draw-vessel'
import type { GoodsLook, GoodsPlan } from '@/seed/pictures/goods-plan.facts'
import { seededRandom, type Chance } from '@/seed/seeded-random'

interface Piece {
  px: number
  colour: string
  chance: Chance
}

const ellipse = ([rx, ry]: readonly [number, number], fill: string, more = '') =>
  `<ellipse rx="${rx}" ry="${ry}" fill="${fill}" ${more}/>`

const leafPath = (px: number) =>
  `M0 ${-px / 2}C${px * 0.34} ${-px * 0.25} ${px * 0.3} ${px * 0.3} 0 ${px / 2}C${-px * 0.3} ${px * 0.3} ${-px * 0.34} ${-px * 0.25} 0 ${-px / 2}Z`

/** One piece around its own middle, in plain shapes. */
const pieces: Record<GoodsLook, (piece: Piece) => string> = {
  head: ({ px, colour, chance }) =>
    Array.from({ length: 11 }, (_, at) => {
      const reach = px * (0.42 - at * 0.026)
      return `<g transform="rotate(${at * 137 + chance.between(-8, 8)}) translate(0 ${-reach * 0.5})">${ellipse([reach * 0.56, reach * 0.7], colour, `stroke="#4f7d2c" stroke-width="3" fill-opacity="${0.75 + at * 0.02}"`)}</g>`
    }).join('') + ellipse([px * 0.09, px * 0.09], '#dbe8b0'),
  leaf: ({ px, colour }) =>
    `<path d="${leafPath(px)}" fill="${colour}" stroke="#1f4a2c" stroke-opacity="0.5" stroke-width="3"/><path d="M0 ${-px * 0.4}V${px * 0.48}" stroke="#cfe3c0" stroke-opacity="0.6" stroke-width="3"/>`,
  pellet: ({ px, colour }) =>
    ellipse([px / 2, px * 0.46], colour, 'stroke="#4b2413" stroke-opacity="0.55" stroke-width="2"') +
    `<circle cx="${-px * 0.14}" cy="${-px * 0.14}" r="${px * 0.1}" fill="#ffffff" fill-opacity="0.22"/>`,
  crumb: ({ px, colour, chance }) => ellipse([px / 2, px * chance.between(0.26, 0.46)], colour),
  worm: ({ px, colour, chance }) =>
    `<path d="M${-px / 2} 0q${px * 0.25} ${chance.between(-px * 0.4, px * 0.4)} ${px * 0.5} 0t${px * 0.5} ${chance.between(-12, 12)}" fill="none" stroke="${colour}" stroke-width="13" stroke-linecap="round"/>`,
  fruit: ({ px, colour }) =>
    ellipse([px / 2, px * 0.48], colour, 'stroke="#6f1d14" stroke-opacity="0.5" stroke-width="3"') +
    `<path d="M0 ${-px * 0.4}l${px * 0.16} ${-px * 0.08}M0 ${-px * 0.4}l${-px * 0.16} ${-px * 0.06}M0 ${-px * 0.4}v${-px * 0.14}" stroke="#3f7a37" stroke-width="7" stroke-linecap="round"/>`,
}

/** Evenly over the vessel's inside, rim to rim. */
function somewhere({ isRound, cx, cy, rx, ry }: Water, chance: Chance) {
  const reach = 1.04
  if (!isRound)
    return { x: cx + chance.between(-reach, reach) * rx, y: cy + chance.between(-reach, reach) * ry }
  const [far, turn] = [Math.sqrt(chance.next()) * reach, chance.between(0, 2 * Math.PI)]
  return { x: cx + far * rx * Math.cos(turn), y: cy + far * ry * Math.sin(turn) }
}

/** A vessel full of what is sold, seen from above, as SVG. The same plan always gives the same picture. */
export function drawGoods(plan: GoodsPlan): string {
  const chance = seededRandom(`picture ${plan.name}`)
  const { below, water } = drawVessel(plan.vessel)
  const { widthPx, heightPx } = PICTURE
  const heap = Array.from({ length: plan.count }, () => {
    const { x, y } = somewhere(water, chance)
    const piece = { px: plan.piecePx * chance.between(0.82, 1.12), colour: chance.pick(plan.colours), chance }
    return `<g transform="translate(${x} ${y}) rotate(${chance.between(0, 360)})">${pieces[plan.look](piece)}</g>`
  }).join('')
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${widthPx}" height="${heightPx}" viewBox="0 0 ${widthPx} ${heightPx}">${drawGround(plan.ground, chance)}${below}${heap}</svg>`
}
