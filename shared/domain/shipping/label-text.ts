/** What the printed font has: the letters of western Europe and the marks of ordinary text (code page 1252). */
const printed = /^[\u0020-\u007e\u00a0-\u00ff€ŒœŠšŸŽž‘’“”–—…•]$/u

const letters = (text: string) => [...text.normalize('NFC')]

/** Whether a text comes out of the printer as it is. */
export const isLabelText = (text: string): boolean => letters(text).every((letter) => printed.test(letter))

/** A text as it can be printed: letters the font lacks lose their accent, or are a question mark that everybody sees. */
export function labelText(text: string): string {
  return letters(text)
    .map((letter) => {
      const [plain = ''] = letter.normalize('NFD')
      return [letter, plain].find((one) => printed.test(one)) ?? '?'
    })
    .join('')
}
