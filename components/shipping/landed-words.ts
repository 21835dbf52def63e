import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

interface Cost {
  totalCents: number
  landedCents: number
  boxes: number
}

/** What one animal comes to at the buyer's end beside what it costs at the gate. */
export function landedWords(
  count: number,
  { shipped, collected }: { shipped: Cost; collected: Cost },
): string {
  const boxes = shipped.boxes === 1 ? '1 box' : `${shipped.boxes} boxes`
  return `${printCount(count)} shipped: ${printCents(shipped.landedCents)} each at your end, all in (${printCents(shipped.totalCents)} in ${boxes}). Collected: ${printCents(collected.landedCents)} each (${printCents(collected.totalCents)}).`
}
