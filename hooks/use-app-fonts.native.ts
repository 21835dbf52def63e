import { useFonts } from 'expo-font'

// Metro takes font files by require() or import of the asset; the names are those of the theme.
import body from '@/assets/fonts/AtkinsonHyperlegibleNext-400.ttf'
import strong from '@/assets/fonts/AtkinsonHyperlegibleNext-600.ttf'
import species from '@/assets/fonts/BricolageGrotesque-600.ttf'
import title from '@/assets/fonts/BricolageGrotesque-700.ttf'

/** True once text may be drawn; also when a font failed, since the system's letters are better than none. */
export function useAppFonts(): boolean {
  const [isLoaded, error] = useFonts({
    'AtkinsonHyperlegibleNext-400': body,
    'AtkinsonHyperlegibleNext-600': strong,
    'BricolageGrotesque-600': species,
    'BricolageGrotesque-700': title,
  })
  return isLoaded || error !== null
}
