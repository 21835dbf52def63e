import { asks } from '@/components/tools/asks'
import type { Tool } from '@/components/tools/tool'
import { animalClassOf } from '@/shared/domain/season/season-lane'
import { speciesFacts } from '@/shared/domain/species/species.facts'
import { parseCount } from '@/shared/units/count'

const both = (text: string) => ({ us: text, metric: text })

/** What a parcel is asked for. */
export const parcelAsks: Pick<Tool, 'asks' | 'choosing'> = {
  choosing: [
    {
      id: 'species',
      label: 'Animal',
      start: 'bluegill',
      choices: speciesFacts
        .filter(({ id, lengthWeight }) => lengthWeight && animalClassOf(id) !== null)
        .map(({ id, commonName }) => ({ value: id, label: commonName })),
    },
  ],
  asks: [
    { id: 'count', label: 'How many', start: both('50'), read: parseCount },
    asks.lengthMm({ start: { us: '2 1/2', metric: '6.5' } }),
    asks.hours({ label: 'Hours in the bag', start: both('24') }),
    asks.hours({ id: 'fastedHours', label: 'Hours without food before', start: both('48') }),
    asks.waterC({ id: 'startC', label: 'Water at packing', start: { us: '62', metric: '17' } }),
    asks.pH(),
    asks.waterC({ id: 'coldC', label: 'Coldest air on the way', start: { us: '40', metric: '4' } }),
    asks.waterC({ id: 'hotC', label: 'Warmest air on the way', start: { us: '65', metric: '18' } }),
  ],
}
