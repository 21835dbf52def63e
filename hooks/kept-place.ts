/** A place as it may be kept and sent: a ZIP or a location cell with its name, never a point. */
export interface KeptPlace {
  /** What a search takes: a ZIP when one was chosen (it names the state exactly), else the cell id. */
  near: string
  cell: string
  label: string
  state: string
}

const key = 'place'
const listeners = new Set<() => void>()
let current = readPlace()

function readPlace(): KeptPlace | null {
  try {
    const read: unknown = JSON.parse(localStorage.getItem(key) ?? 'null')
    return isPlace(read) ? read : null
  } catch {
    return null // storage refused, or what lies there is not ours
  }
}

function isPlace(read: unknown): read is KeptPlace {
  if (typeof read !== 'object' || read === null) return false
  const parts = read as Record<string, unknown>
  return ['near', 'cell', 'label', 'state'].every((name) => typeof parts[name] === 'string')
}

export function keptPlace(): KeptPlace | null {
  return current
}

export function keepPlace(place: KeptPlace | null) {
  current = place
  try {
    if (place) localStorage.setItem(key, JSON.stringify(place))
    else localStorage.removeItem(key)
  } catch {
    // Not kept: it holds until this page is closed.
  }
  listeners.forEach((tell) => tell())
}

export function onKeptPlace(tell: () => void) {
  listeners.add(tell)
  return () => {
    listeners.delete(tell)
  }
}
