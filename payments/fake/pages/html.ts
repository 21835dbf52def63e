/** Text that is markup already; everything else is escaped on its way into a page. */
export class Html {
  constructor(readonly markup: string) {}
}

type Part = Html | Html[] | number | string | null

function escaped(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;')
}

function markupOf(part: Part | undefined): string {
  if (part === null || part === undefined) return ''
  if (part instanceof Html) return part.markup
  if (Array.isArray(part)) return part.map((one) => one.markup).join('')
  return escaped(String(part))
}

export function html(strings: TemplateStringsArray, ...parts: Part[]): Html {
  return new Html(strings.map((text, index) => text + markupOf(parts[index])).join(''))
}

export function dollars(cents: number): string {
  const sign = cents < 0 ? '-' : ''
  const rest = Math.abs(cents)
  return `${sign}$${Math.floor(rest / 100).toLocaleString('en-US')}.${String(rest % 100).padStart(2, '0')}`
}
