import { Appearance } from 'react-native'

export type ThemeChoice = 'system' | 'light' | 'dark'

const listeners = new Set<() => void>()
let current: ThemeChoice = 'system'

export function themeChoice(): ThemeChoice {
  return current
}

export function chooseTheme(choice: ThemeChoice) {
  current = choice
  Appearance.setColorScheme(choice === 'system' ? 'unspecified' : choice)
  listeners.forEach((tell) => tell())
}

export function onThemeChoice(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
