import { askDevice, type NoLocation } from './ask-device'

import { printCellId } from '@/shared/domain/geo/location-cell-id'
import { buyerCellAt } from '@/shared/domain/geo/location-cell'

export type CellAnswer = { cell: string } | { why: NoLocation }

/** The cell the device stands in. The point is dropped here: nothing finer ever leaves the device. */
export async function ownCell(): Promise<CellAnswer> {
  const answer = await askDevice()
  if (typeof answer === 'string') return { why: answer }
  const cell = buyerCellAt(answer)
  return cell ? { cell: printCellId(cell) } : { why: 'unknown' }
}
