import { asks } from '@/components/tools/asks'
import { printFigure } from '@/components/tools/print-figure'
import { barometerMmHg } from '@/shared/domain/water/barometer'
import { oxygenSaturationMgPerL } from '@/shared/domain/water/oxygen-saturation'
import { waterEquations } from '@/shared/domain/water/water-equations.facts'
import { readNumber } from '@/shared/units/read-number'

import type { Ask, Tool } from '@/components/tools/tool'

const M_PER_FT = 0.3048

const elevationM: Ask = {
  id: 'elevationM',
  label: 'Height above the sea',
  start: { us: '500', metric: '150' },
  suffix: { us: 'ft', metric: 'm' },
  read: (text, units) => {
    const height = readNumber(text)
    return height === null ? null : units === 'us' ? height * M_PER_FT : height
  },
}

export const oxygen: Tool = {
  id: 'oxygen',
  title: 'Oxygen: the most that water can hold',
  lead: 'Warm water, salt and height leave less oxygen for fish, just when they need more.',
  asks: [
    asks.waterC(),
    elevationM,
    {
      ...asks.mgPerL({ id: 'salinityPpt', label: 'Salt', start: { us: '0', metric: '0' } }),
      suffix: { us: 'ppt', metric: 'ppt' },
    },
  ],
  equations: [waterEquations.oxygenSaturation, waterEquations.barometer],
  answer({ figures: { waterC = 0, elevationM: height = 0, salinityPpt = 0 } }) {
    const pressureMmHg = barometerMmHg(height)
    const full = pressureMmHg && oxygenSaturationMgPerL({ waterC, pressureMmHg, salinityPpt })
    if (!full) {
      return {
        refusal: 'It holds for 32 to 104 °F (0 to 40 °C), up to 40 ppt of salt and 13,000 ft (4,000 m).',
      }
    }
    return {
      lines: [
        { label: 'Full of oxygen at', text: `${printFigure(full)} mg/L` },
        { label: 'Seven tenths of that', text: `${printFigure(full * 0.7)} mg/L` },
      ],
      note: 'A pump keeps water near full only while it runs. Measure at dawn, when it is lowest.',
    }
  },
  cautions: ['What a fish needs depends on the species: see the listing, or ask who raised them.'],
}
