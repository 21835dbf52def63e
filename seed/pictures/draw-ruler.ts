interface RulerLook {
  body: string
  ink: string
  edge: string
}

const looks = {
  wood: { body: '#e6c07a', ink: '#4a3413', edge: '#b98f45' },
  steel: { body: '#cdd4d9', ink: '#1e262c', edge: '#98a3ab' },
  white: { body: '#fbfbf8', ink: '#20242b', edge: '#c9ccc8' },
} as const satisfies Record<string, RulerLook>
export type RulerKind = keyof typeof looks

// Strokes on a grid of 2 by 4: the drawing needs no font, so it looks the same wherever it is drawn.
const digits = [
  'M0 0H2V4H0Z',
  'M0 1L1 0V4M0 4H2',
  'M0 0H2V2H0V4H2',
  'M0 0H2V4H0M0 2H2',
  'M0 0V2H2M2 0V4',
  'M2 0H0V2H2V4H0',
  'M2 0H0V4H2V2H0',
  'M0 0H2L0.7 4',
  'M0 0H2V4H0ZM0 2H2',
  'M2 2H0V0H2V4H0',
] as const

/** Smaller ones could not be read in a list of listings. */
const LEAST_NUMERAL_PX = 4.7

function numeral(value: number, inchPx: number, ink: string): string {
  const unit = Math.max(inchPx * 0.055, LEAST_NUMERAL_PX)
  const parts = [...String(value)].map(
    (digit, at) =>
      `<path transform="translate(${at * 2.9 * unit} 0) scale(${unit})" d="${digits[Number(digit)] ?? ''}"/>`,
  )
  return `<g fill="none" stroke="${ink}" stroke-width="0.62" stroke-linecap="round" stroke-linejoin="round">${parts.join('')}</g>`
}

/** A ruler of so many inches with quarter marks and numbers, its zero at the origin, lying along the x axis. */
export function drawRuler(kind: RulerKind, inches: number, inchPx: number): string {
  const { body, ink, edge } = looks[kind]
  const [height, margin] = [Math.max(inchPx * 0.74, 58), inchPx * 0.16]
  const width = inches * inchPx + 2 * margin
  const ticks = Array.from({ length: inches * 4 + 1 }, (_, quarter) => {
    const long = quarter % 4 === 0 ? 0.34 : quarter % 2 === 0 ? 0.23 : 0.15
    const x = (quarter * inchPx) / 4
    return `<path d="M${x} 0V${long * inchPx}" stroke="${ink}" stroke-width="${inchPx * (quarter % 4 === 0 ? 0.03 : 0.02)}"/>`
  })
  const numbers = Array.from({ length: inches }, (_, at) => {
    const value = at + 1
    const wide = value > 9 ? 0.3 : 0.16
    return `<g transform="translate(${value * inchPx - wide * inchPx - inchPx * 0.05} ${inchPx * 0.42})">${numeral(value, inchPx, ink)}</g>`
  })
  return `<rect x="${-margin}" y="0" width="${width}" height="${height}" rx="${inchPx * 0.05}" fill="${body}" stroke="${edge}" stroke-width="${inchPx * 0.025}"/>${ticks.join('')}${numbers.join('')}`
}
