import type { Size } from './map-view'

interface Named {
  name: string
  x: number
  y: number
}

interface Lettering {
  fontPx: number
  letterSpacingPx: number
}

// An average letter of our typeface is a little over half as wide as the type is high.
const LETTER_SHARE = 0.56
const ROOM_PX = 4

/**
 * The names that can be read: inside the map and clear of each other, those nearest its middle first. `x`, `y` is the
 * middle of a name's foot, in pixels.
 */
export function placeNames<Name extends Named>(
  names: readonly Name[],
  size: Size,
  lettering: Lettering,
): Name[] {
  const { fontPx, letterSpacingPx } = lettering
  const boxOf = ({ name, x, y }: Named) => {
    const half = (name.length * (fontPx * LETTER_SHARE + letterSpacingPx)) / 2 + ROOM_PX
    return { left: x - half, right: x + half, top: y - fontPx - ROOM_PX, bottom: y + ROOM_PX }
  }
  type Box = ReturnType<typeof boxOf>
  const meets = (a: Box, b: Box) =>
    a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom
  const isInside = (box: Box) =>
    box.left >= 0 && box.right <= size.widthPx && box.top >= 0 && box.bottom <= size.heightPx
  const away = ({ x, y }: Named) => Math.hypot(x - size.widthPx / 2, y - size.heightPx / 2)
  const placed: { name: Name; box: Box }[] = []
  for (const name of names.toSorted((one, other) => away(one) - away(other))) {
    const box = boxOf(name)
    if (isInside(box) && placed.every((other) => !meets(box, other.box))) placed.push({ name, box })
  }
  return placed.map(({ name }) => name)
}
