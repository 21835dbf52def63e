export type ThemeChoice = 'system' | 'light' | 'dark'

const yearS = 31_536_000
const listeners = new Set<() => void>()
let current = readChoice()
showChoice(current)

function readChoice(): ThemeChoice {
  const stored = /(?:^|;\s*)theme=(light|dark)(?:;|$)/.exec(document.cookie)?.[1]
  return stored === 'light' || stored === 'dark' ? stored : 'system'
}

function showChoice(choice: ThemeChoice) {
  const page = document.documentElement
  if (choice === 'system') page.removeAttribute('data-theme')
  else page.setAttribute('data-theme', choice)
}

export function themeChoice(): ThemeChoice {
  return current
}

export function chooseTheme(choice: ThemeChoice) {
  current = choice
  showChoice(choice)
  // A cookie, so that the server's first paint is in it already.
  const ageS = choice === 'system' ? 0 : yearS
  document.cookie = `theme=${choice}; path=/; max-age=${ageS}; samesite=lax`
  listeners.forEach((tell) => tell())
}

export function onThemeChoice(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
