import * as SecureStore from 'expo-secure-store'

import type { KeptPlace } from './kept-place'

const key = 'place'
const listeners = new Set<() => void>()
let current = readPlace()

function readPlace(): KeptPlace | null {
  try {
    const read = JSON.parse(SecureStore.getItem(key) ?? 'null') as KeptPlace | null
    return typeof read?.near === 'string' ? read : null
  } catch {
    return null
  }
}

export function keptPlace(): KeptPlace | null {
  return current
}

export function keepPlace(place: KeptPlace | null) {
  current = place
  if (place) SecureStore.setItem(key, JSON.stringify(place))
  else void SecureStore.deleteItemAsync(key)
  listeners.forEach((tell) => tell())
}

export function onKeptPlace(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
