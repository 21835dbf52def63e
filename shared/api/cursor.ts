import { Problem } from '@/shared/api/problem'

const CURSOR_VERSION = 1

/** Opaque page cursor: base64url JSON of a version and plain values. */
export function writeCursor(values: Record<string, string | number>): string {
  const bytes = new TextEncoder().encode(JSON.stringify({ v: CURSOR_VERSION, ...values }))
  return btoa(String.fromCharCode(...bytes))
    .replaceAll('+', '-')
    .replaceAll('/', '_')
    .replaceAll('=', '')
}

/** Throws `cursor-unreadable` for anything this version did not write. */
export function readCursor(text: string): Record<string, string | number> {
  try {
    const bytes = Uint8Array.from(atob(text.replaceAll('-', '+').replaceAll('_', '/')), (c) =>
      c.charCodeAt(0),
    )
    const read: unknown = JSON.parse(new TextDecoder().decode(bytes))
    if (typeof read !== 'object' || read === null || !('v' in read) || read.v !== CURSOR_VERSION)
      throw new Error()
    for (const value of Object.values(read)) {
      if (typeof value !== 'string' && !(typeof value === 'number' && Number.isFinite(value)))
        throw new Error()
    }
    return read as unknown as Record<string, string | number>
  } catch {
    throw new Problem('cursor-unreadable', 'Start the search again; that page link is no longer valid.')
  }
}
