/** RFC 5545, 3.1: octets a content line may have, its CRLF not counted. */
export const MOST_OCTETS = 75

const encoder = new TextEncoder()

/** One content line as its folded lines, joined by CRLF and a space; a character's bytes always stay together. */
export function foldLine(line: string): string {
  const parts: string[] = []
  let part = ''
  let octets = 0
  for (const character of line) {
    const size = encoder.encode(character).length
    if (octets + size > MOST_OCTETS) {
      parts.push(part)
      part = ''
      // The space that marks a continued line counts too.
      octets = 1
    }
    part += character
    octets += size
  }
  return [...parts, part].join('\r\n ')
}
