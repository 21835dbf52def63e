import { advice, saltGPerL } from '@/shared/domain/transport/advice.facts'
import type { PackingPlan, PackingTask } from '@/shared/domain/transport/plan-packing'
import type { BagSize, BoxSize } from '@/shared/domain/transport/packing.facts'
import { heatPacks } from '@/shared/domain/transport/packs.facts'
import { reasonTexts } from '@/shared/domain/transport/reason-texts.facts'
import { fahrenheitFromC } from '@/shared/units/temperature'

export interface SheetSection {
  heading: string
  lines: readonly string[]
}

export interface PackingSheet {
  title: string
  sections: readonly SheetSection[]
  /** The same on every box. */
  label: readonly string[]
}

type SheetTask = Pick<PackingTask, 'animals' | 'water'>

/** As much of a plan as a sheet tells. */
export interface SheetPlan extends Pick<
  PackingPlan,
  'boxes' | 'bagsPerBox' | 'animalsPerBag' | 'packs' | 'answer'
> {
  box: Pick<BoxSize, 'box'>
  bag: Pick<BagSize, 'waterL' | 'oxygenL'>
  /** Absent: the material was not chosen from a list with prices. */
  priceCents?: number
  /** The weather it was reckoned by is the forecast of the day. */
  isForecast?: boolean
}

const plain = (value: number, digits = 1) => String(Number(value.toFixed(digits)))
/** Both scales: these figures decide whether animals live. */
const degrees = (degreesC: number) => `${plain(degreesC)} °C (${plain(fahrenheitFromC(degreesC), 0)} °F)`
const some = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`

/** Everything a person at the packing table has to know, in words; figures in L, g, cm, °C and hours. */
export function packingSheet(task: SheetTask, plan: SheetPlan): PackingSheet {
  const { animals, water } = task
  const name = animals.species.commonName
  return {
    title: `Packing sheet: ${animals.count} ${name}`,
    sections: [
      { heading: 'What goes into each bag', lines: bagLines(task, plan) },
      { heading: 'What goes into each box', lines: boxLines(plan) },
      { heading: 'Before packing', lines: beforeLines(task) },
      { heading: 'On the way', lines: wayLines(plan) },
      {
        heading: 'For whoever receives them',
        lines: [advice.count.text, advice.temper.text, advice.pH.text, advice.open.text],
      },
      { heading: 'Cautions', lines: cautionLines(plan) },
    ],
    label: [
      'LIVE ANIMALS',
      `${name}, ${some(plan.bagsPerBox, 'bag', 'bags')} in this box`,
      'This side up. Keep out of sun and frost.',
      `Packed at ${degrees(water.startC)}. Open within ${plain(plan.answer.hours)} hours.`,
    ],
  }
}

function bagLines({ animals }: SheetTask, { bag, animalsPerBag, boxes, bagsPerBox }: SheetPlan): string[] {
  const massG = animalsPerBag * animals.massG
  return [
    `${animals.count} animals in all, ${plain(animals.massG, 2)} g each, in ${some(boxes * bagsPerBox, 'bag', 'bags')}`,
    `At most ${animalsPerBag} animals a bag: ${plain(massG)} g, ${plain(massG / bag.waterL)} g in each litre`,
    `${plain(bag.waterL)} L of water and ${plain(bag.oxygenL)} L of oxygen; two bags, one inside the other`,
    'Press the air out, fill with oxygen, twist, fold and band the neck twice.',
  ]
}

function boxLines({ box: { box }, boxes, bagsPerBox, packs, priceCents }: SheetPlan): string[] {
  const { lengthCm, widthCm, heightCm, wallMm } = box
  return [
    `${some(boxes, 'box', 'boxes')}, inside ${plain(lengthCm)} × ${plain(widthCm)} × ${plain(heightCm)} cm, walls of ${plain(wallMm)} mm foam`,
    `${some(bagsPerBox, 'bag', 'bags')} in each box, lying close, with no room to slide`,
    ...(packs.heat
      ? [
          `${some(packs.heat.count, 'heat pack', 'heat packs')} of ${heatPacks[packs.heat.id].ratedHours} hours in each box, under the lid`,
          advice.heat.text,
        ]
      : []),
    ...(packs.cold
      ? [
          `${some(packs.cold.count, 'cold pack', 'cold packs')} of 0.45 kg in each box, on top of the bags`,
          advice.ice.text,
        ]
      : []),
    ...(packs.heat || packs.cold ? [] : ['No heat packs and no cold packs.']),
    ...(priceCents === undefined
      ? []
      : [`Material about $${(priceCents / 100).toFixed(2)}, at the prices of the list.`]),
  ]
}

function beforeLines({ animals: { species }, water }: SheetTask): string[] {
  const salt = saltGPerL(species)
  return [
    ...(species.fastHours === null ? [] : [`No food for ${species.fastHours} hours. ${advice.fast.text}`]),
    `Bring the packing water to ${degrees(water.startC)}.`,
    ...(salt ? [`Salt, if used: ${salt[0]} to ${salt[1]} g per litre, plain, without additives.`] : []),
  ]
}

function wayLines({ answer: { hours, cold, hot }, isForecast }: SheetPlan): string[] {
  const coldest = cold?.coldest
  const warmest = hot?.warmest
  return [
    `Reckoned for ${plain(hours)} hours from packing to release.`,
    ...(coldest ? [`On the cold day the water falls to ${degrees(coldest.waterC)} at the coldest.`] : []),
    ...(warmest ? [`On the hot day it rises to ${degrees(warmest.waterC)} at the warmest.`] : []),
    isForecast
      ? 'Reckoned by the forecast, 2 °C to the cold and to the hot side of it.'
      : 'Long-term weather is no forecast: look at the forecast on the day.',
  ]
}

function cautionLines({ answer: { reasons } }: Pick<SheetPlan, 'answer'>): string[] {
  const said = reasons.map(({ code, value, limit }) => {
    const { text, unit } = reasonTexts[code]
    const figures =
      value === null || limit === null ? '' : ` (${plain(value)} against ${plain(limit)} ${unit})`
    return `${text}${figures}`
  })
  return [...said, 'Reckoned from published figures and house rules; it does not replace your own judgement.']
}
