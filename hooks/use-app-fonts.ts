/** True once text may be drawn. The web shows fallbacks of the same size until the fonts arrive (global.css). */
export function useAppFonts(): boolean {
  return true
}
