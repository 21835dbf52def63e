/** The id of a reference that may or may not be expanded; null when there is none. */
export function idOf(reference: { id: string } | string | null | undefined): string | null {
  return typeof reference === 'string' ? reference : (reference?.id ?? null)
}
