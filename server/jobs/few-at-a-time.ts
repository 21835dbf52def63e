/** Works through the list, so many at once: one that waits holds up its own lane alone. */
export async function fewAtATime<T>(
  list: readonly T[],
  most: number,
  work: (one: T) => Promise<unknown>,
): Promise<void> {
  const rest = list.values()
  const lane = async () => {
    for (const one of rest) await work(one)
  }
  await Promise.all(Array.from({ length: most }, lane))
}
