import { printLength } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'
import { printBothTemperatures } from '@/shared/units/temperature'

const MM_PER_CM = 10

interface Tier {
  fromCount: number
  unitCents: number
}
interface Window {
  day: string
  from: string
  until: string
  capacity: number
}
interface Photo {
  photoId: string
  takenOn: string
  hasRuler: boolean
  caption?: string
}

const capitalised = (word: string) => `${word.charAt(0).toUpperCase()}${word.slice(1)}`

function printList(field: string, list: readonly unknown[]): string {
  if (field === 'tiers') {
    return (list as Tier[]).map((one) => `from ${one.fromCount}: ${printCents(one.unitCents)}`).join('; ')
  }
  if (field === 'windows') {
    return (list as Window[])
      .map((one) => `${one.day} ${one.from} to ${one.until} (${one.capacity})`)
      .join('; ')
  }
  if (field === 'photos') {
    return (list as Photo[])
      .map((one) =>
        [one.photoId.slice(0, 6), one.takenOn, one.hasRuler ? 'ruler' : '', one.caption ?? '']
          .filter(Boolean)
          .join(' '),
      )
      .join('; ')
  }
  if (field === 'shipping.days') return list.map((day) => capitalised(String(day))).join(', ')
  return list.map(String).join(', ')
}

/** One answer of a listing in words, for somebody who compares two versions. An answer not given is ''. */
export function printAnswer(field: string, value: unknown): string {
  if (value === undefined || value === null) return ''
  if (Array.isArray(value)) return printList(field, value)
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (typeof value === 'number' && field.endsWith('Mm')) return printLength(value / MM_PER_CM, 'us')
  if (typeof value === 'number' && field.endsWith('Cents')) return printCents(value)
  if (typeof value === 'number' && field.endsWith('temperatureC')) return printBothTemperatures(value, 'us')
  return String(value)
}
