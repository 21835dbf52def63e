import { useSyncExternalStore } from 'react'
import { useColorScheme } from 'react-native'

import { chooseTheme, onThemeChoice, themeChoice, type ThemeChoice } from './theme-choice'

import type { Scheme } from '@/constants/theme'

interface Theme {
  choice: ThemeChoice
  scheme: Scheme
  choose: (choice: ThemeChoice) => void
}

export function useTheme(): Theme {
  const choice = useSyncExternalStore(onThemeChoice, themeChoice, () => 'system' as const)
  const system: Scheme = useColorScheme() === 'dark' ? 'dark' : 'light'
  return { choice, scheme: choice === 'system' ? system : choice, choose: chooseTheme }
}
