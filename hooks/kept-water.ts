import type { Water } from '@/shared/domain/water/compare-waters'

/** The reader's own tank as they typed it in, in fixed units. It stays on this device and is never sent. */
export type KeptWater = Partial<Water>

const key = 'water'
const listeners = new Set<() => void>()
let current = readWater()

function readWater(): KeptWater {
  try {
    return waterOf(JSON.parse(localStorage.getItem(key) ?? '{}'))
  } catch {
    return {} // storage refused, or what lies there is not ours
  }
}

function waterOf(read: unknown): KeptWater {
  if (typeof read !== 'object' || read === null) return {}
  const parts = read as Record<string, unknown>
  const names = ['waterC', 'pH', 'khPpm'] as const
  return Object.fromEntries(
    names.flatMap((name) => (typeof parts[name] === 'number' ? [[name, parts[name]]] : [])),
  )
}

export function keptWater(): KeptWater {
  return current
}

export function keepWater(water: KeptWater) {
  current = water
  try {
    if (Object.keys(water).length > 0) localStorage.setItem(key, JSON.stringify(water))
    else localStorage.removeItem(key)
  } catch {
    // Not kept: it holds until this page is closed.
  }
  listeners.forEach((tell) => tell())
}

export function onKeptWater(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
