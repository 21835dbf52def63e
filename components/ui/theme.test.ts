import { readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

import { breakpointOf, palettes, type ColorName, type Scheme } from '@/constants/theme'

const css = readFileSync('public/global.css', 'utf8')

function variablesAfter(selector: string): Record<string, string> {
  const block = css.slice(css.indexOf(selector)).split('}')[0] ?? ''
  return Object.fromEntries(
    Array.from(block.matchAll(/--(\w+): (#\w+);/g), ([, name, value]) => [name, value]),
  )
}

// WCAG 2.2: relative luminance and contrast ratio.
function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
    const share = parseInt(hex.slice(at, at + 2), 16) / 255
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}

function contrast(scheme: Scheme, front: ColorName, back: ColorName): number {
  const [light = 0, dark = 0] = [palettes[scheme][front], palettes[scheme][back]]
    .map(luminance)
    .toSorted((a, b) => b - a)
  return (light + 0.05) / (dark + 0.05)
}

describe('the colours', () => {
  const lower = (scheme: Scheme) =>
    Object.fromEntries(Object.entries(palettes[scheme]).map(([name, hex]) => [name, hex.toLowerCase()]))

  it('stand in the style sheet as they stand in the theme', () => {
    expect(variablesAfter(':root {')).toEqual(lower('light'))
    const dark = { ...lower('light'), ...variablesAfter(":root:not([data-theme='light'])") }
    expect(dark).toEqual(lower('dark'))
    expect({ ...lower('light'), ...variablesAfter(":root[data-theme='dark']") }).toEqual(lower('dark'))
  })

  const schemes: Scheme[] = ['light', 'dark']
  const grounds: ColorName[] = ['mist', 'card']
  const cases = schemes.flatMap((scheme) => grounds.map((ground) => ({ scheme, ground })))

  it.each(cases)('read at 7:1 as text on $scheme $ground', ({ scheme, ground }) => {
    for (const text of ['ink', 'muted', 'netting'] as const) {
      expect(contrast(scheme, text, ground), text).toBeGreaterThanOrEqual(7)
    }
  })

  it.each(cases)('read at 4.5:1 as verdicts on $scheme $ground', ({ scheme, ground }) => {
    for (const verdict of ['frost', 'warm', 'safe', 'danger'] as const) {
      expect(contrast(scheme, verdict, ground), verdict).toBeGreaterThanOrEqual(4.5)
    }
  })

  it.each(cases)('show the edge of a control at 3:1 on $scheme $ground', ({ scheme, ground }) => {
    expect(contrast(scheme, 'edge', ground)).toBeGreaterThanOrEqual(3)
  })

  it.each(schemes)('read at 7:1 on filled buttons, %s', (scheme) => {
    const pairs = [
      ['onPrimary', 'primary'],
      ['onNetting', 'netting'],
      ['onAlgae', 'algae'],
      ['onDanger', 'danger'],
    ] as const
    for (const [front, back] of pairs) expect(contrast(scheme, front, back), front).toBeGreaterThanOrEqual(7)
  })
})

it('calls 699 pixels a phone, 700 middle and 1100 wide', () => {
  expect([320, 699, 700, 1099, 1100].map(breakpointOf)).toEqual([
    'phone',
    'phone',
    'middle',
    'middle',
    'wide',
  ])
})
