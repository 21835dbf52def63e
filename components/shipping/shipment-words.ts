import type { ShipAddress, ShownShipment } from '@/shared/contracts/shipments'

export function addressWords({ name, street, city, state, zip }: ShipAddress): string {
  return `${name}, ${street}, ${city}, ${state} ${zip}`
}

export const deliverWords: Record<ShownShipment['deliverTo'], string> = {
  door: 'At the door: somebody must be there',
  counter: 'Held at the carrier’s counter, to be collected',
}

const HOUR_MS = 3_600_000

/** Hours the bag has been shut when it is opened: known once it has come, before that as planned. null: not known. */
export function hoursInBag({
  dispatchedAt,
  arrivedAt,
  check,
}: Pick<ShownShipment, 'dispatchedAt' | 'arrivedAt' | 'check'>): number | null {
  if (dispatchedAt && arrivedAt) {
    return Math.max(0, Math.round((Date.parse(arrivedAt) - Date.parse(dispatchedAt)) / HOUR_MS))
  }
  return check?.packing ? Math.round(check.packing.hours) : null
}

/** From here on a shut bag is opened and emptied at once (rules of the trade, B5). House rule. */
export const LONG_BAG_HOURS = 6

/** What to do with the bag, by how long it has been shut. */
export function openingSteps(hours: number | null): string[] {
  if (hours === null) return []
  return hours > LONG_BAG_HOURS
    ? [
        `The bag has been shut for about ${hours} hours. Float it, still shut, in the shade for about half an hour, until both waters are equally warm.`,
        'Then open it and move the animals into your water at once. Do not mix slowly: once the bag is open, the ammonia in its water turns poisonous.',
      ]
    : [
        `The bag has been shut for about ${hours} hours. Float it in the shade until both waters are equally warm, open it, and add your water little by little.`,
      ]
}
