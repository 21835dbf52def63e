/** Hands a made file to the browser to be kept or printed. */
export function saveFile(
  bytes: Uint8Array<ArrayBuffer>,
  { name, type }: { name: string; type: string },
): void {
  const url = URL.createObjectURL(new Blob([bytes], { type }))
  const link = document.createElement('a')
  link.href = url
  link.download = name
  link.click()
  // The browser has begun to read it by then.
  setTimeout(() => URL.revokeObjectURL(url), 10_000)
}
