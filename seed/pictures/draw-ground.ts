import type { GroundKind } from '@/seed/pictures/picture-plan.facts'
import type { Chance } from '@/seed/seeded-random'

export const PICTURE = { widthPx: 1120, heightPx: 840 } as const
const { widthPx: wide, heightPx: high } = PICTURE

const fill = (colour: string) => `<rect width="${wide}" height="${high}" fill="${colour}"/>`
const many = (count: number, draw: (at: number) => string) =>
  Array.from({ length: count }, (_, at) => draw(at)).join('')

const grounds: Record<GroundKind, (chance: Chance) => string> = {
  planks: (chance) => {
    const board = high / 5
    return (
      fill('#6d5137') +
      many(5, (at) => {
        const tone = chance.pick(['#a98660', '#b08e68', '#a17f5b', '#b6956f'])
        const grain = many(4, () => {
          const y = at * board + chance.between(18, board - 18)
          const x = chance.between(-40, wide * 0.7)
          return `<path d="M${x} ${y}q${chance.between(60, 140)} ${chance.between(-7, 7)} ${chance.between(180, 420)} 0" fill="none" stroke="#8d6b49" stroke-width="3" stroke-linecap="round"/>`
        })
        return `<rect y="${at * board}" width="${wide}" height="${board - 7}" fill="${tone}"/>${grain}`
      })
    )
  },
  concrete: (chance) =>
    fill('#b5bab6') +
    many(
      90,
      () =>
        `<circle cx="${chance.between(0, wide)}" cy="${chance.between(0, high)}" r="${chance.between(1.5, 5)}" fill="${chance.pick(['#a4aaa6', '#c4c8c4', '#9ba29e'])}"/>`,
    ) +
    `<path d="M0 ${chance.between(80, 160)}L${wide} ${chance.between(40, 120)}" stroke="#969d99" stroke-width="7"/>`,
  grass: (chance) =>
    fill('#84a05b') +
    many(260, () => {
      const [x, y] = [chance.between(0, wide), chance.between(0, high)]
      return `<path d="M${x} ${y}l${chance.between(-9, 9)} ${chance.between(-26, -14)}" stroke="${chance.pick(['#6d8a48', '#9ab672', '#75924e'])}" stroke-width="4" stroke-linecap="round"/>`
    }),
  gravel: (chance) =>
    fill('#8f887c') +
    many(420, () => {
      const [x, y] = [chance.between(0, wide), chance.between(0, high)]
      return `<ellipse cx="${x}" cy="${y}" rx="${chance.between(9, 24)}" ry="${chance.between(7, 15)}" transform="rotate(${chance.whole(0, 90)} ${x} ${y})" fill="${chance.pick(['#a89f91', '#b8b0a3', '#9a9285', '#c3bcb0', '#8b8f8f'])}"/>`
    }),
  bench: (chance) => {
    const towel = chance.pick(['#8aa4c8', '#c58d84', '#86ab94'])
    return (
      fill('#e6e1d5') +
      many(
        9,
        (at) => `<rect x="${at * 140 - 20}" width="46" height="${high}" fill="${towel}" opacity="0.45"/>`,
      ) +
      many(
        7,
        (at) => `<rect y="${at * 140 - 30}" width="${wide}" height="46" fill="${towel}" opacity="0.45"/>`,
      )
    )
  },
}

export function drawGround(kind: GroundKind, chance: Chance): string {
  return grounds[kind](chance)
}
