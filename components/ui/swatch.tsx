import { color, type ColorName } from '@/constants/theme'

export type SwatchPattern = 'solid' | 'dots' | 'diagonal' | 'outline'

interface Props {
  pattern: SwatchPattern
  tint: ColorName
  sizePx?: number
}

const dots = [3.5, 8, 12.5].flatMap((x) => [3.5, 8, 12.5].map((y) => ({ x, y })))
const slants = ['M1 6L6 1', 'M1 11L11 1', 'M2 15L15 2', 'M7 15L15 7', 'M12 15L15 12']

/** The pattern that goes with a colour, so that the colour is never alone. */
export function Swatch({ pattern, tint, sizePx = 16 }: Props) {
  const pen = color[tint]
  return (
    <svg
      width={sizePx}
      height={sizePx}
      viewBox="0 0 16 16"
      aria-hidden
      focusable={false}
      style={{ flexShrink: 0 }}
    >
      <rect
        x={1}
        y={1}
        width={14}
        height={14}
        fill={pattern === 'solid' ? pen : 'none'}
        stroke={pen}
        strokeWidth={1.5}
      />
      {pattern === 'dots'
        ? dots.map(({ x, y }) => <circle key={`${x} ${y}`} cx={x} cy={y} r={1.2} fill={pen} />)
        : null}
      {pattern === 'diagonal'
        ? slants.map((d) => <path key={d} d={d} stroke={pen} strokeWidth={1.5} />)
        : null}
    </svg>
  )
}
