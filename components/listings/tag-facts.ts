import type { IconName } from '@/components/ui/icon-paths'
import type { Tone } from '@/constants/theme'
import type { Href } from 'expo-router'

export interface TagBadge {
  word: string
  tone: Tone
  icon?: IconName
}

/** What is written on a tag, ready to read: the tag itself counts and converts nothing. */
export interface TagFacts {
  title: string
  scientificName?: string
  /** "2 to 3 in", "5 lb bag". */
  sizeText: string
  stage?: string
  /** "240 left". */
  countText: string
  /** "78 °F"; absent for what does not swim. */
  waterText?: string
  priceText: string
  /** "a fish", "per pound". */
  priceUnitText: string
  /** "about 12 mi"; absent until a place is known. */
  distanceText?: string
  placeText: string
  /** "Pickup Sat 14 Jun". */
  dayText?: string
  photoUrl?: string
  /** What the photo shows; the title when absent. */
  photoText?: string
  /** Stands in the photo's place when there is none. */
  icon?: IconName
  badges: readonly TagBadge[]
  href?: Href
}
