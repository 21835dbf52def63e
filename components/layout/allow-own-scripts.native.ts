/** A phone's bundle loads no script by address: nothing to allow. */
export function allowOwnScripts() {
  return undefined
}
