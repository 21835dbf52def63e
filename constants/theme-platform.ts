type Palettes<Name extends string> = Record<'light' | 'dark', Record<Name, string>>

// On the web a colour is a custom property of public/global.css: one static style sheet serves both
// schemes, nothing re-renders on a change, and the page is right before the script has loaded.
export function colorsOf<Name extends string>(palettes: Palettes<Name>): Record<Name, string> {
  const names = Object.keys(palettes.light) as Name[]
  return Object.fromEntries(names.map((name) => [name, `var(--${name})`])) as Record<Name, string>
}

const titleFamily = '"Bricolage Grotesque", "Title fallback", system-ui, sans-serif'
const bodyFamily = '"Atkinson Hyperlegible Next", "Body fallback", system-ui, sans-serif'

export const fonts = {
  title: { fontFamily: titleFamily, fontWeight: '700' },
  species: { fontFamily: titleFamily, fontWeight: '600' },
  body: { fontFamily: bodyFamily, fontWeight: '400' },
  strong: { fontFamily: bodyFamily, fontWeight: '600' },
} as const
