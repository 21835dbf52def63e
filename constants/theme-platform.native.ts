import { Appearance } from 'react-native'

type Palettes<Name extends string> = Record<'light' | 'dark', Record<Name, string>>

// Native style sheets hold plain values: the scheme is read once, when the app starts.
export function colorsOf<Name extends string>(palettes: Palettes<Name>): Record<Name, string> {
  return palettes[Appearance.getColorScheme() === 'dark' ? 'dark' : 'light']
}

export const fonts = {
  title: { fontFamily: 'BricolageGrotesque-700' },
  species: { fontFamily: 'BricolageGrotesque-600' },
  body: { fontFamily: 'AtkinsonHyperlegibleNext-400' },
  strong: { fontFamily: 'AtkinsonHyperlegibleNext-600' },
} as const
