/** Every photo is kept at these widths and no other. */
export const photoWidths = [320, 800, 1600] as const
export type PhotoWidth = (typeof photoWidths)[number]

/** `<32 hex>-320.webp`: our own names, whatever the file was called. */
export function photoFileName(photoId: string, width: PhotoWidth): string {
  return `${photoId}-${width}.webp`
}
