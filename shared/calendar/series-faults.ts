import { readLines } from '@/shared/calendar/read-lines'

/** What a calendar program would stumble over when it gets these files of one event in this order. */
export function seriesFaults(files: readonly Uint8Array[]): string[] {
  const told = files.map((bytes) => {
    const { lines } = readLines(bytes)
    const valueOf = (name: string) => lines.find((line) => line.name === name)?.value ?? ''
    return {
      uid: valueOf('UID'),
      sequence: Number(valueOf('SEQUENCE')),
      method: valueOf('METHOD'),
      time: `${valueOf('DTSTART')}/${valueOf('DTEND')}`,
    }
  })
  return told.flatMap((now, at) => {
    const before = told[at - 1]
    if (!before) return []
    const isChanged = now.time !== before.time || now.method !== before.method
    return [
      ...(now.uid === before.uid ? [] : ['the UID changed']),
      ...(now.sequence >= before.sequence ? [] : ['SEQUENCE fell']),
      ...(isChanged && now.sequence <= before.sequence ? ['SEQUENCE did not rise with a change'] : []),
      ...(before.method === 'CANCEL' && now.method !== 'CANCEL' ? ['a cancelled event came back'] : []),
    ]
  })
}
