import { MOST_OCTETS } from '@/shared/calendar/fold-line'

export interface ContentLine {
  name: string
  params: Record<string, string>
  value: string
}

const CR = 13
const LF = 10

/** Ends of lines and their lengths, on the bytes themselves. */
function byteFaults(bytes: Uint8Array): string[] {
  const faults: string[] = []
  let from = 0
  for (let at = 0; at < bytes.length; at++) {
    const isCr = bytes[at] === CR
    if (isCr && bytes[at + 1] !== LF) faults.push(`a CR without its LF at octet ${at}`)
    if (bytes[at] !== LF) continue
    if (bytes[at - 1] !== CR) faults.push(`a bare LF at octet ${at}`)
    const octets = at - from - (bytes[at - 1] === CR ? 1 : 0)
    if (octets > MOST_OCTETS) faults.push(`a line of ${octets} octets`)
    if (octets === 0) faults.push('an empty line')
    from = at + 1
  }
  if (from !== bytes.length || bytes.length === 0) faults.push('the last line does not end in CRLF')
  return faults
}

/** Each physical line must be whole UTF-8: a fold inside a character breaks readers that unfold after decoding. */
function encodingFaults(bytes: Uint8Array): string[] {
  const strict = new TextDecoder('utf-8', { fatal: true })
  let from = 0
  for (let at = 0; at <= bytes.length; at++) {
    if (at < bytes.length && bytes[at] !== LF) continue
    try {
      strict.decode(bytes.subarray(from, at))
    } catch {
      return ['a line that is not whole UTF-8']
    }
    from = at + 1
  }
  return []
}

function readLine(line: string): ContentLine | null {
  const found =
    /^([A-Za-z0-9-]+)((?:;[A-Za-z0-9-]+=(?:"[^"]*"|[^";:,]*)(?:,(?:"[^"]*"|[^";:,]*))*)*):(.*)$/su.exec(line)
  if (!found) return null
  const [, name = '', given = '', value = ''] = found
  const params = Object.fromEntries(
    [...given.matchAll(/;([A-Za-z0-9-]+)=("[^"]*"|[^;]*)/gu)].map(([, key = '', text = '']) => [
      key.toUpperCase(),
      text.replace(/^"|"$/g, ''),
    ]),
  )
  return { name: name.toUpperCase(), params, value }
}

/** The unfolded content lines of a calendar file, and what is wrong with its bytes. */
export function readLines(bytes: Uint8Array): { lines: ContentLine[]; faults: string[] } {
  const faults = [...byteFaults(bytes), ...encodingFaults(bytes)]
  const text = new TextDecoder().decode(bytes)
  const unfolded = text.replace(/\r?\n[ \t]/gu, '').split(/\r?\n/u)
  const lines: ContentLine[] = []
  for (const one of unfolded.filter((line) => line !== '')) {
    const line = readLine(one)
    if (line) lines.push(line)
    else faults.push(`not a content line: ${one.slice(0, 40)}`)
  }
  return { lines, faults }
}
