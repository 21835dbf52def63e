import { colorsOf, fonts } from './theme-platform'

const algae = '#C8E356'
const inkOnAlgae = '#141B34'

// WCAG contrast is asserted in components/ui/theme.test.ts; public/global.css carries the same values.
export const palettes = {
  light: {
    mist: '#F1F4F8',
    card: '#FFFFFF',
    sunk: '#E4E9F1',
    ink: '#141B34',
    muted: '#434C68',
    netting: '#2A3579',
    onNetting: '#FFFFFF',
    algae,
    onAlgae: inkOnAlgae,
    primary: '#2A3579',
    onPrimary: '#FFFFFF',
    frost: '#175E9E',
    warm: '#9C3D12',
    safe: '#1D6B45',
    danger: '#A3162B',
    onDanger: '#FFFFFF',
    edge: '#7A839C',
    // Decoration only (hairlines between rows): carries no meaning, so no contrast bar.
    line: '#CFD6E3',
    scrim: '#141B3499',
  },
  dark: {
    mist: '#0D1222',
    card: '#161D35',
    sunk: '#0A0E1B',
    ink: '#EEF1FA',
    muted: '#B3BCD6',
    netting: '#AEB9FF',
    onNetting: '#0D1222',
    algae,
    onAlgae: inkOnAlgae,
    primary: algae,
    onPrimary: inkOnAlgae,
    frost: '#86C5FF',
    warm: '#FFB088',
    safe: '#86DDB0',
    danger: '#FF9AA8',
    onDanger: '#0D1222',
    edge: '#6F7A9B',
    line: '#2C3554',
    scrim: '#05081299',
  },
} as const

export type ColorName = keyof typeof palettes.light
export type Scheme = keyof typeof palettes
export type Tone = 'neutral' | 'info' | 'safe' | 'caution' | 'danger' | 'cold' | 'hot' | 'today'

export const color: Record<ColorName, string> = colorsOf(palettes)

export const font = fonts

// 13 / 15 / 17 / 20 / 25 / 32, each with the line height it is set on.
export const type = {
  small: { fontSize: 13, lineHeight: 18 },
  note: { fontSize: 15, lineHeight: 21 },
  body: { fontSize: 17, lineHeight: 25 },
  lead: { fontSize: 20, lineHeight: 26 },
  title: { fontSize: 25, lineHeight: 30 },
  hero: { fontSize: 32, lineHeight: 36 },
} as const
export type TypeSize = keyof typeof type

export const space = { xs: 4, sm: 8, md: 12, lg: 16, xl: 24, xxl: 32, huge: 48 } as const
export const radius = { tag: 4, full: 999 } as const
export const touchPx = 44
export const motionMs = 160

export const breakpoints = { middlePx: 700, widePx: 1100 } as const
export type Breakpoint = 'phone' | 'middle' | 'wide'

export function breakpointOf(widthPx: number): Breakpoint {
  if (widthPx >= breakpoints.widePx) return 'wide'
  return widthPx >= breakpoints.middlePx ? 'middle' : 'phone'
}

export const layout = { readablePx: 680, pagePx: 1040, filtersPx: 280, railPx: 208, smallRailPx: 88 } as const
