import { parseLengthCm } from '@/shared/units/length'
import { parseMassG } from '@/shared/units/mass'
import { readNumber } from '@/shared/units/read-number'
import { parseTemperatureC } from '@/shared/units/temperature'
import { parseVolumeL } from '@/shared/units/volume'

import type { Ask } from './tool'

type Change = Partial<Pick<Ask, 'id' | 'label' | 'hint' | 'start'>>

const both = (text: string) => ({ us: text, metric: text })
const plain = (text: string) => readNumber(text)

const ask = (made: Ask) => (change?: Change) => ({ ...made, ...change })

/** The figures that several calculators ask for, each read the same way everywhere. */
export const asks = {
  waterC: ask({
    id: 'waterC',
    label: 'Water temperature',
    start: { us: '77', metric: '25' },
    suffix: { us: '°F', metric: '°C' },
    read: parseTemperatureC,
  }),
  pH: ask({ id: 'pH', label: 'pH', start: both('7.4'), read: plain }),
  massG: ask({
    id: 'massG',
    label: 'One animal weighs',
    start: { us: '0.35 oz', metric: '10 g' },
    suffix: { us: 'lb, oz', metric: 'g, kg' },
    read: parseMassG,
  }),
  lengthMm: ask({
    id: 'lengthMm',
    label: 'Length, nose to tail tip',
    start: { us: '4', metric: '10' },
    suffix: { us: 'in', metric: 'cm' },
    read: (text, units) => {
      const cm = parseLengthCm(text, units)
      return cm === null ? null : cm * 10
    },
  }),
  days: ask({ id: 'days', label: 'Days from now', start: both('60'), read: plain }),
  hours: ask({
    id: 'hours',
    label: 'Hours on the way',
    start: both('6'),
    suffix: both('h'),
    read: plain,
  }),
  volumeL: ask({
    id: 'volumeL',
    label: 'Water in the system',
    start: { us: '250', metric: '1000' },
    suffix: { us: 'gal', metric: 'L' },
    read: parseVolumeL,
  }),
  mgPerL: ask({ id: 'mgPerL', label: 'Test', start: both('1'), suffix: both('ppm'), read: plain }),
} as const
