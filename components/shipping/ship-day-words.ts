import type { Tone } from '@/constants/theme'
import type { IconName } from '@/components/ui/icon-paths'
import type { ShipDayOffer } from '@/shared/contracts/shipments'
import { printDay } from '@/shared/times/print-time'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

type Judged = Pick<ShipDayOffer, 'verdict' | 'worst'>

/** "Mon, May 10" for a day of the calendar, whatever the reader's zone. */
export const dayWords = (day: string) => printDay(`${day}T12:00:00Z`, 'UTC')

export function wayWords({ shipDay, arriveDay }: Pick<ShipDayOffer, 'shipDay' | 'arriveDay'>): string {
  return `Leaves ${dayWords(shipDay)}, arrives ${dayWords(arriveDay)}`
}

/** What the verdict rests on, to stand after it. */
export const basisWords: Record<ShipDayOffer['basis'], string> = {
  forecast: 'by the forecast',
  'long-term': 'by the weather of many years',
}

export interface VerdictLook {
  word: string
  tone: Exclude<Tone, 'neutral' | 'today'>
  icon: IconName
}

/** The verdict of a way, never by colour alone. */
export function verdictLook({ verdict, worst }: Judged): VerdictLook {
  if (verdict === 'safe') return { word: 'Safe to ship', tone: 'safe', icon: 'check' }
  if (verdict === 'unknown') return { word: 'We cannot say', tone: 'caution', icon: 'question' }
  if (worst?.side === 'cold') return { word: 'Too cold to ship', tone: 'cold', icon: 'cold' }
  if (worst?.side === 'hot') return { word: 'Too hot to ship', tone: 'hot', icon: 'hot' }
  return { word: 'Not safe to ship', tone: 'danger', icon: 'stop' }
}

/** "Dayton, OH: down to 12 °F (-11 °C)"; '' when no air is to blame. */
export function worstWords({ worst }: Pick<ShipDayOffer, 'worst'>, units: UnitSystem): string {
  if (!worst) return ''
  const reach = worst.side === 'cold' ? 'down to' : 'up to'
  return `${worst.place}: ${reach} ${printBothTemperatures(worst.airC, units)}`
}

/** Why a day is not to be had, the place of the worst air first; empty for a safe one. */
export function reasonsAgainst(
  offer: Pick<ShipDayOffer, 'verdict' | 'worst' | 'reasons'>,
  units: UnitSystem,
): string[] {
  if (offer.verdict === 'safe') return []
  const told = [worstWords(offer, units), ...offer.reasons].filter(Boolean)
  if (told.length > 0) return told
  return offer.verdict === 'unknown'
    ? ['Nobody has published enough about these animals, or there is no weather record near enough.']
    : ['They would suffer or die on this way.']
}
