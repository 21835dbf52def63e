/**
 * The form in which names are compared: lower case, accents and punctuation off, plural s off, one space between
 * words. 'Nile Tilapias' and 'nile-tilapia' become 'nile tilapia'. '' when nothing is left.
 */
export function normaliseName(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/×/g, ' x ')
    .replace(/['’`]/g, '')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
    .split(' ')
    .map(singular)
    .join(' ')
}

/** 'oreochromis niloticus' → 'o niloticu': how a genus is shortened once a text has named it. '' for one word. */
export function abbreviateGenus(normalised: string): string {
  const [genus, ...rest] = normalised.split(' ')
  return genus && rest.length > 0 ? `${genus.slice(0, 1)} ${rest.join(' ')}` : ''
}

function singular(word: string): string {
  if (/ies$/.test(word) && word.length > 5) return word.slice(0, -3) + 'y'
  return word.length > 3 && word.endsWith('s') && !word.endsWith('ss') ? word.slice(0, -1) : word
}
