const dollars = /^\$?\s*(\d{1,3}(?:,\d{3})+|\d+)?(?:\.(\d{1,2}))?$/

/** Integer cents as '$53.40'; below zero '-$5.34'. */
export function printCents(cents: number): string {
  const size = Math.abs(cents)
  const whole = Math.trunc(size / 100).toLocaleString('en-US')
  return `${cents < 0 ? '-' : ''}$${whole}.${String(size % 100).padStart(2, '0')}`
}

/** '1,200', '$3.50', '.75' → integer cents. null: not readable, more than two decimals, a sign, over $10 million. */
export function parseDollars(text: string): number | null {
  const parts = dollars.exec(text.trim())
  if (!parts || (parts[1] === undefined && parts[2] === undefined)) return null
  const whole = Number((parts[1] ?? '0').replaceAll(',', ''))
  const cents = whole * 100 + Number((parts[2] ?? '').padEnd(2, '0'))
  return cents <= 1_000_000_000 ? cents : null
}
