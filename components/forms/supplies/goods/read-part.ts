/** One answer of a draft, however deep: a draft may hold anything, so nothing is taken for granted. */
export function partOf(draft: unknown, path: string): unknown {
  return path
    .split('.')
    .reduce<unknown>(
      (value, step) =>
        typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[step] : undefined,
      draft,
    )
}
export const textOf = (draft: unknown, path: string) => {
  const value = partOf(draft, path)
  return typeof value === 'string' ? value : ''
}
export const numberOf = (draft: unknown, path: string) => {
  const value = partOf(draft, path)
  return typeof value === 'number' ? value : null
}
