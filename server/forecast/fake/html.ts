/** Text that is markup already; everything else is escaped on its way into the page. */
export class Html {
  constructor(readonly markup: string) {}
}

type Part = Html | Html[] | number | string | null

const MARKS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }

function markupOf(part: Part | undefined): string {
  if (part === null || part === undefined) return ''
  if (part instanceof Html) return part.markup
  if (Array.isArray(part)) return part.map((one) => one.markup).join('')
  return String(part).replace(/[&<>"']/g, (mark) => MARKS[mark] ?? mark)
}

export function html(strings: TemplateStringsArray, ...parts: Part[]): Html {
  return new Html(strings.map((text, at) => text + markupOf(parts[at])).join(''))
}
