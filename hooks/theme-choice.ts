export type ThemeChoice = 'system' | 'light' | 'dark'

const key = 'theme'
const listeners = new Set<() => void>()
let current = readChoice()
showChoice(current)

function readChoice(): ThemeChoice {
  try {
    const stored = localStorage.getItem(key)
    return stored === 'light' || stored === 'dark' ? stored : 'system'
  } catch {
    return 'system' // storage refused (private window): the system's choice is right
  }
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
  try {
    if (choice === 'system') localStorage.removeItem(key)
    else localStorage.setItem(key, choice)
  } catch {
    // Not kept: it holds until this page is closed.
  }
  listeners.forEach((tell) => tell())
}

export function onThemeChoice(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
