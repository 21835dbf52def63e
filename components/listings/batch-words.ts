import { percent } from './percent'
import { stageName } from './stage-words'

import { stages } from '@/shared/domain/species/stages.facts'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { findState } from '@/shared/domain/rules/find-state'

const countMethods: Record<FishBody['countMethod'], string> = {
  hand: 'Counted by hand, in tens into the bag.',
  'sample-weight':
    'Counted by weight: a few weighed samples give the mean, the whole weight gives the number.',
  displacement: 'Counted by displacement: by how much water the fish push up.',
}

const sexes: Record<FishBody['sex'], string> = {
  mixed: 'Males and females mixed.',
  'all-male': 'Made nearly all male, so that they grow instead of breeding.',
  unknown: 'Nobody has looked.',
}

const waterSources: Record<FishBody['water']['source'], string> = {
  well: 'Well',
  town: 'Town water',
  rain: 'Rain',
  spring: 'Spring',
  pond: 'Pond',
}

export const countMethodWords = ({ countMethod }: FishBody) => countMethods[countMethod]

export function sexWords({ sex, sexClaimPct }: FishBody): string {
  return sexClaimPct === undefined ? sexes[sex] : `${sexes[sex]} The grower claims ${percent(sexClaimPct)}.`
}

export const waterSourceWords = ({ water }: FishBody) => waterSources[water.source]

/** "Fingerling: Young fish of about 1 to 4 inches." */
export function stageWords({ stage }: FishBody): string {
  const meaning = stages.find(({ id }) => id === stage)?.meaning
  return meaning ? `${stageName(stage)}: ${meaning}` : stageName(stage)
}

export function originWords({ origin, originState }: FishBody): string {
  const from = originState ? ` from ${findState(originState)?.name ?? originState}` : ''
  if (origin === 'hatched-here') return 'Hatched at this farm.'
  if (origin === 'grown-on') return `Bought small${from} and grown on here.`
  return `Bought in${from}.`
}

export function overcountWords({ overcountPct }: FishBody): string {
  if (overcountPct === 0) return 'None: you get the number you pay for.'
  const packed = Math.floor(100 + overcountPct)
  return `${percent(overcountPct)} extra for free: you pay 100 and get ${packed}, so that a few losses cost you nothing.`
}

export function feedWords({ feed }: FishBody): string {
  const taking = feed.onPellets
    ? 'Feed-trained: they take pellets.'
    : 'Not on pellets yet: live or natural food.'
  return feed.words ? `${taking} ${feed.words}` : taking
}

export function placeKindWords(placeKind: string): string {
  return placeKind === 'public-place' ? 'At a public place' : 'At the farm gate'
}
