export type Point = readonly [x: number, y: number]

const at = (points: readonly Point[], index: number): Point => {
  const found = points[(index + points.length) % points.length]
  if (!found) throw new RangeError('a path needs points')
  return found
}

const figure = (value: number) => value.toFixed(1)

/** A closed smooth line through all points (Catmull-Rom, written as cubic curves). */
export function smoothPath(points: readonly Point[]): string {
  const [startX, startY] = at(points, 0)
  const curves = points.map((_, index) => {
    const [before, from, to, after] = [-1, 0, 1, 2].map((step) => at(points, index + step)) as [
      Point,
      Point,
      Point,
      Point,
    ]
    const controls = [
      from[0] + (to[0] - before[0]) / 6,
      from[1] + (to[1] - before[1]) / 6,
      to[0] - (after[0] - from[0]) / 6,
      to[1] - (after[1] - from[1]) / 6,
      ...to,
    ]
    return `C${controls.map(figure).join(' ')}`
  })
  return `M${figure(startX)} ${figure(startY)}${curves.join('')}Z`
}

/** A closed line with corners. */
export function cornerPath(points: readonly Point[]): string {
  return `M${points.map(([x, y]) => `${figure(x)} ${figure(y)}`).join('L')}Z`
}
