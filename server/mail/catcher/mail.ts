import type { AddressObject, ParsedMail } from 'mailparser'

export interface Mail {
  id: string
  receivedAt: string
  from: string
  /** Whom the sending program named as recipients: blind copies too. */
  to: string[]
  subject: string
  text: string
  html: string | null
  links: string[]
  headers: Record<string, string>
  attachments: { name: string; type: string; bytes: number }[]
}

const ENDS_A_SENTENCE = /[.,;:!?)\]}>]+$/

/** Web addresses in the order in which they stand, each once. */
export function linksIn(body: string): string[] {
  const found = body.match(/https?:\/\/[^\s"'<>]+/g) ?? []
  return [...new Set(found.map((link) => link.replaceAll('&amp;', '&').replace(ENDS_A_SENTENCE, '')))]
}

function addressText(address: AddressObject | AddressObject[] | undefined): string {
  return [address ?? []]
    .flat()
    .map((one) => one.text)
    .join(', ')
}

function headersOf(parsed: ParsedMail): Record<string, string> {
  return Object.fromEntries(
    parsed.headerLines.map(({ key, line }) => [key, line.slice(line.indexOf(':') + 1).trim()]),
  )
}

/** What people and tests want to know of a mail. `id` begins with the moment of arrival in milliseconds. */
export function readMail(id: string, parsed: ParsedMail): Mail {
  const headers = headersOf(parsed)
  const html = parsed.html || null
  const text = parsed.text ?? ''
  return {
    id,
    receivedAt: new Date(Number.parseInt(id, 10)).toISOString(),
    from: addressText(parsed.from),
    to: (headers['x-envelope-to'] ?? '').split(',').map((one) => one.trim().toLowerCase()),
    subject: parsed.subject ?? '(no subject)',
    text,
    html,
    links: linksIn(`${text}\n${html ?? ''}`),
    headers,
    attachments: parsed.attachments.map((file, at) => ({
      name: file.filename ?? `part-${at + 1}`,
      type: file.contentType,
      bytes: file.size,
    })),
  }
}
