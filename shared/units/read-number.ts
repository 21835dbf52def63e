const fractionSigns: Record<string, string> = {
  '¼': '1/4',
  '½': '1/2',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
}
const grouped = /^\d{1,3}(,\d{3})+(\.\d+)?$/
const plain = /^(\d+(\.\d+)?|\.\d+)$/
const mixed = /^(?:(\d+)[\s-]+)?(\d+)\/(\d+)$/

/** Reads '1,200', '2.5', '.5', '2 1/4', '2¼' (never a sign, an exponent or NaN). null: not a number we read. */
export function readNumber(text: string): number | null {
  const spelt = text.replace(/[¼½¾⅛⅜⅝⅞]/g, (sign) => ` ${fractionSigns[sign] ?? ''}`).trim()
  if (grouped.test(spelt)) return Number(spelt.replaceAll(',', ''))
  if (plain.test(spelt)) return finite(Number(spelt))
  const parts = mixed.exec(spelt)
  if (!parts) return null
  const below = Number(parts[3])
  return below === 0 ? null : finite(Number(parts[1] ?? 0) + Number(parts[2]) / below)
}

const finite = (value: number) => (Number.isFinite(value) ? value : null)
