import * as SecureStore from 'expo-secure-store'

import type { KeptWater } from './kept-water'

const key = 'water'
const listeners = new Set<() => void>()
let current = readWater()

function readWater(): KeptWater {
  try {
    return (JSON.parse(SecureStore.getItem(key) ?? 'null') as KeptWater | null) ?? {}
  } catch {
    return {}
  }
}

export function keptWater(): KeptWater {
  return current
}

export function keepWater(water: KeptWater) {
  current = water
  if (Object.keys(water).length > 0) SecureStore.setItem(key, JSON.stringify(water))
  else void SecureStore.deleteItemAsync(key)
  listeners.forEach((tell) => tell())
}

export function onKeptWater(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
