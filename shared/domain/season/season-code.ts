// Figures 0 to 88 as one plain character each, none of which a string literal has to escape. The last means "none".
const alphabet = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz!#%&()*+,-./:;<=>?@[]^_{|}~ '

/** Figures of the season table as text. null: none. */
export function encodeFigures(figures: readonly (number | null)[]): string {
  return figures.map((figure) => alphabet[figure ?? alphabet.length - 1] ?? '').join('')
}

/** Figure at a place of such a text. null: none. */
export function valueOf(text: string, at: number): number | null {
  const value = alphabet.indexOf(text.charAt(at) || ' ')
  return value === alphabet.length - 1 ? null : value
}
