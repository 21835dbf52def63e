import { create } from 'qrcode'

/** White rim in modules that a reader needs around the code (ISO/IEC 18004). */
const rim = 4

/** The dark modules of a QR code as one SVG path, in a square of `size` units. */
export function qrPath(text: string): { path: string; size: number } {
  const { modules } = create(text, { errorCorrectionLevel: 'M' })
  let path = ''
  for (let row = 0; row < modules.size; row++) {
    for (let column = 0; column < modules.size; column++) {
      if (modules.get(row, column)) path += `M${column + rim} ${row + rim}h1v1h-1z`
    }
  }
  return { path, size: modules.size + 2 * rim }
}
