/** A figure to so many significant digits, in plain notation: 0.0573, 1.2, 340. */
export function printFigure(value: number, digits = 3): string {
  if (value === 0) return '0'
  const rounded = Number(value.toPrecision(digits))
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(rounded))))
  return rounded.toLocaleString('en-US', { maximumFractionDigits: Math.min(decimals, 8) })
}
