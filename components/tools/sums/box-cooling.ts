import { asks } from '@/components/tools/asks'
import { froeseBoxEquation, froeseWaterC } from '@/shared/domain/transport/froese-box'
import { parseLengthCm } from '@/shared/units/length'
import { printBothTemperatures } from '@/shared/units/temperature'

import type { Ask, Tool } from '@/components/tools/tool'

const inside = (id: string, label: string, start: Ask['start']): Ask => ({
  id,
  label,
  start,
  suffix: { us: 'in', metric: 'cm' },
  read: parseLengthCm,
})

export const boxCooling: Tool = {
  id: 'box-cooling',
  title: 'How fast a foam box cools',
  lead: 'Water in a closed foam box with walls of one inch, standing in steady air.',
  asks: [
    inside('lengthCm', 'Inside length', { us: '15 3/4', metric: '40' }),
    inside('widthCm', 'Inside width', { us: '11 3/4', metric: '30' }),
    asks.volumeL({ label: 'Water in the box', start: { us: '2.1', metric: '8' } }),
    asks.waterC({ id: 'startC', label: 'Water at the start' }),
    asks.waterC({ id: 'airC', label: 'Air around it', start: { us: '40', metric: '5' } }),
    asks.hours(),
  ],
  equations: [froeseBoxEquation],
  answer({ figures: { lengthCm = 0, widthCm = 0, volumeL = 0, startC = 0, airC = 0, hours = 0 }, units }) {
    const box = { lengthCm, widthCm, volumeMl: volumeL * 1000 }
    const at = (after: number) => froeseWaterC({ box, startC, airC, hours: after })
    const [half, end] = [at(hours / 2), at(hours)]
    if (half === null || end === null) {
      return { refusal: 'The water would freeze, or a figure is outside what was measured.' }
    }
    return {
      lines: [
        { label: 'Water at the end', text: printBothTemperatures(end, units) },
        { label: 'Half way', text: printBothTemperatures(half, units) },
      ],
      note: 'No packs are reckoned here: the trip check does that, hour by hour.',
    }
  },
  cautions: ['Measured on boxes of about 8 L of water. A thin or wet wall loses warmth faster.'],
}
