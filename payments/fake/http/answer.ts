/** What goes back over the wire; null instead of one means that the line breaks. */
export interface Answer {
  status: number
  headers: Record<string, string>
  body: string
}

export function jsonAnswer(status: number, body: object, headers: Record<string, string> = {}): Answer {
  return { status, headers: { 'content-type': 'application/json', ...headers }, body: JSON.stringify(body) }
}
