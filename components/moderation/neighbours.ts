interface Neighbours {
  previous: string | undefined
  next: string | undefined
}

/** Who stands before and after a version in the queue as it was read; the server's own "next" where it is not in it. */
export function neighboursOf(
  versionId: string,
  queue: readonly string[],
  serverNext: string | undefined,
): Neighbours {
  const at = queue.indexOf(versionId)
  if (at === -1) return { previous: undefined, next: serverNext ?? queue[0] }
  return {
    previous: queue[at - 1],
    next: queue[at + 1] ?? (serverNext === queue[0] ? undefined : serverNext),
  }
}
