import type { AnswerLine } from '@/components/tools/tool'
import type { PackingPlan } from '@/shared/domain/transport/plan-packing'
import { printCents } from '@/shared/units/money'
import type { UnitSystem } from '@/shared/units/unit-system'
import { printVolume } from '@/shared/units/volume'

const some = (count: number, one: string) =>
  `${count} ${one}${count === 1 ? '' : one.endsWith('x') ? 'es' : 's'}`

function packWords({ packs: { heat, cold } }: PackingPlan): string {
  if (heat)
    return `${some(heat.count, 'heat pack')} of ${heat.id.replace('heat-', '').replace('h', ' hours')}, air holes open`
  return cold ? `${some(cold.count, 'cold pack')} of 1 lb (450 g)` : 'none'
}

/** A packing plan as lines to read at the table. */
export function planLines(plan: PackingPlan, units: UnitSystem): AnswerLine[] {
  const { box, bag, boxes, bagsPerBox, animalsPerBag, priceCents } = plan
  const { lengthCm, widthCm, heightCm, wallMm } = box.box
  return [
    { label: 'Boxes', text: `${some(boxes, 'box')}, ${some(bagsPerBox, 'bag')} in each` },
    { label: 'Animals in a bag', text: `${animalsPerBag} at most` },
    {
      label: 'Water and oxygen in a bag',
      text: `${printVolume(bag.waterL, units)} and ${printVolume(bag.oxygenL, units)}, bag doubled`,
    },
    { label: 'Box inside', text: `${lengthCm} × ${widthCm} × ${heightCm} cm, foam walls of ${wallMm} mm` },
    { label: 'Packs in each box', text: packWords(plan) },
    { label: 'Material, about', text: printCents(priceCents) },
  ]
}
