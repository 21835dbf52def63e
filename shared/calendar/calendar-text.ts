const encoder = new TextEncoder()
const decoder = new TextDecoder()

/** RFC 5545, 3.3.11 TEXT: backslash, semicolon, comma and line break escaped; other control characters left out. */
export function escapeText(text: string): string {
  // Half a surrogate pair has no UTF-8: encoding makes it the replacement character.
  return decoder
    .decode(encoder.encode(text))
    .replace(/\r\n?|[\u0085\u2028\u2029]/gu, '\n')
    .replace(/[\u0000-\u0008\u000b-\u001f\u007f]/gu, '')
    .replace(/[\\;,]/gu, (mark) => `\\${mark}`)
    .replaceAll('\n', '\\n')
}

/** The text behind a TEXT value; null when an escape is not one of the five or a mark stands bare. */
export function readText(value: string): string | null {
  if (!/^(?:\\[\\;,nN]|[^\\;,\u0000-\u0008\u000a-\u001f\u007f])*$/u.test(value)) return null
  return value.replace(/\\([\\;,nN])/gu, (_, mark: string) => (mark === 'n' || mark === 'N' ? '\n' : mark))
}
