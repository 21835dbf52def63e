/** Screen readers on phones move by landmark: nothing to skip. */
export function SkipLink() {
  return null
}
