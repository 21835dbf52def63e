import { drawCrayfish, shellLooks } from '@/seed/pictures/draw-crayfish'
import { drawFish } from '@/seed/pictures/draw-fish'
import { drawFishFromAbove } from '@/seed/pictures/draw-fish-from-above'
import { drawGround, PICTURE } from '@/seed/pictures/draw-ground'
import { drawRuler } from '@/seed/pictures/draw-ruler'
import { drawVessel, type Water } from '@/seed/pictures/draw-vessel'
import { fishLooks } from '@/seed/pictures/fish-look.facts'
import type { Point } from '@/seed/pictures/smooth-path'
import type { PicturePlan } from '@/seed/pictures/picture-plan.facts'
import { seededRandom, type Chance } from '@/seed/seeded-random'

const CANDIDATES = 60

interface Placed {
  x: number
  y: number
  turn: number
}

function somewhere(water: Water, lengthPx: number, chance: Chance): Placed {
  for (;;) {
    const [u, v] = [chance.between(-1, 1), chance.between(-1, 1)]
    if (water.isRound && u * u + v * v > 1) continue
    return {
      x: water.cx + u * (water.rx - lengthPx * 0.4),
      y: water.cy + v * (water.ry - lengthPx * 0.4),
      turn: 0,
    }
  }
}

/** Spread over the water: of some chance places each animal takes the one furthest from the others. */
function scatter(water: Water, animals: { count: number; lengthPx: number }, chance: Chance): Placed[] {
  const { count, lengthPx } = animals
  const heading = chance.between(0, 360)
  const isSwirl = water.isRound && chance.happens(0.6)
  const placed: Placed[] = []
  const room = ({ x, y }: Placed) => Math.min(...placed.map((other) => Math.hypot(other.x - x, other.y - y)))
  while (placed.length < count) {
    const places = Array.from({ length: CANDIDATES }, () => somewhere(water, lengthPx, chance))
    const best = places.reduce((one, other) => (room(other) > room(one) ? other : one))
    const along = (Math.atan2(best.y - water.cy, best.x - water.cx) * 180) / Math.PI + 90
    placed.push({ ...best, turn: (isSwirl ? along : heading) + chance.between(-32, 32) })
  }
  return placed
}

/** Where so many fish hang in a viewing box, from -1 to 1 across and down; the side views overlap least like this. */
const hanging: Readonly<Record<number, readonly Point[]>> = {
  2: [
    [-0.42, -0.4],
    [0.42, 0.42],
  ],
  3: [
    [-0.48, -0.6],
    [0.48, -0.08],
    [-0.4, 0.6],
  ],
  4: [
    [-0.5, -0.52],
    [0.5, -0.6],
    [-0.5, 0.56],
    [0.52, 0.48],
  ],
  5: [
    [-0.54, -0.74],
    [0.54, -0.68],
    [0, 0],
    [-0.52, 0.72],
    [0.56, 0.7],
  ],
  6: [
    [-0.52, -0.74],
    [0.5, -0.7],
    [-0.48, 0],
    [0.54, 0.04],
    [-0.54, 0.74],
    [0.5, 0.72],
  ],
  7: [
    [-0.6, -0.76],
    [0.62, -0.72],
    [0.02, -0.42],
    [-0.62, 0.02],
    [0.62, 0.06],
    [0, 0.44],
    [-0.58, 0.8],
  ],
}

function hang(water: Water, count: number, chance: Chance): Placed[] {
  return (hanging[count] ?? []).map(([x, y]) => ({
    x: water.cx + x * water.rx + chance.between(-16, 16),
    y: water.cy + y * water.ry + chance.between(-10, 10),
    turn: chance.between(-7, 7),
  }))
}

function inchPxOf({ vessel, sizeIn: [, high] }: PicturePlan): number {
  return vessel === 'viewing-box'
    ? Math.min(150, 840 / (high * 2.2))
    : Math.max(58, Math.min(118, 720 / (high * 2.8)))
}

function animalsOf(plan: PicturePlan, water: Water, chance: Chance): string {
  const { taxonId, count, vessel, sizeIn } = plan
  const inchPx = inchPxOf(plan)
  const [look, shell] = [fishLooks[taxonId], shellLooks[taxonId]]
  const isBox = vessel === 'viewing-box'
  const places = isBox
    ? hang(water, count, chance)
    : scatter(water, { count, lengthPx: sizeIn[1] * inchPx }, chance)
  return places
    .map(({ x, y, turn }) => {
      const length = chance.between(sizeIn[0], sizeIn[1]) * inchPx
      if (shell)
        return `<g transform="translate(${x} ${y}) rotate(${turn})">${drawCrayfish(shell, length, chance)}</g>`
      if (!look) throw new Error(`nobody has said how ${taxonId} looks`)
      if (isBox) {
        const flip = chance.happens(0.4) ? -1 : 1
        return `<g transform="translate(${x} ${y}) rotate(${turn}) scale(${flip} 1) translate(${-length / 2} 0)">${drawFish(look, length, chance)}</g>`
      }
      const shadow = `<ellipse cx="${x + length * 0.04}" cy="${y + length * 0.07}" rx="${length * 0.4}" ry="${length * 0.075}" transform="rotate(${turn} ${x + length * 0.04} ${y + length * 0.07})" fill="#14181f" opacity="0.16"/>`
      return `${shadow}<g transform="translate(${x} ${y}) rotate(${turn})">${drawFishFromAbove(look, length, chance)}</g>`
    })
    .join('')
}

function rulerOf(plan: PicturePlan, chance: Chance): string {
  if (plan.ruler === null) return ''
  const inchPx = inchPxOf(plan)
  const isBox = plan.vessel === 'viewing-box'
  const inches = Math.floor((isBox ? 880 : 900) / inchPx)
  const x = (PICTURE.widthPx - inches * inchPx) / 2
  const tilt = isBox ? 0 : chance.between(-3, 3)
  const y = isBox ? 628 : 700 - chance.between(0, 14)
  return `<g transform="translate(${x} ${y}) rotate(${tilt} ${(inches * inchPx) / 2} 0)">${drawRuler(plan.ruler, inches, inchPx)}</g>`
}

/** One picture of the demo as SVG. The same plan always gives the same picture. */
export function drawPicture(plan: PicturePlan): string {
  const chance = seededRandom(`picture ${plan.name}`)
  const { below, water, above } = drawVessel(plan.vessel)
  const { widthPx, heightPx } = PICTURE
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${widthPx}" height="${heightPx}" viewBox="0 0 ${widthPx} ${heightPx}">${drawGround(plan.ground, chance)}${below}${animalsOf(plan, water, chance)}${above}${rulerOf(plan, chance)}</svg>`
}
