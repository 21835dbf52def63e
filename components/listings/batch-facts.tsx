import {
  countMethodWords,
  feedWords,
  originWords,
  overcountWords,
  sexWords,
  stageWords,
  waterSourceWords,
} from './batch-words'
import { FactRows } from './fact-rows'
import { plainDay } from './pickup-words'

import { useUnits } from '@/hooks/use-units'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { printCount } from '@/shared/units/count'
import { printLengthRange } from '@/shared/units/length'
import { printBothTemperatures } from '@/shared/units/temperature'

/** Everything the seller says about the batch, in groups, with the words of the trade explained. */
export function BatchFacts({ body }: { body: FishBody }) {
  const units = useUnits()
  const { water, health } = body
  const size = printLengthRange({ minCm: body.sizeLoMm / 10, maxCm: body.sizeHiMm / 10 }, units)
  const largest =
    body.mostPerBuyer === undefined ? '' : `, at most ${printCount(body.mostPerBuyer)} for one buyer`
  return (
    <>
      <FactRows
        title="The animals"
        facts={[
          {
            term: 'Size',
            value: body.ungraded ? `${size}, ungraded: small and large together` : `${size}, graded`,
          },
          { term: 'Stage', value: stageWords(body) },
          { term: 'Strain', value: body.strain },
          { term: 'Hatched', value: plainDay(body.hatchedOn) },
          { term: 'Ready', value: body.readyOn ? `From ${plainDay(body.readyOn)}` : undefined },
          { term: 'Sex', value: sexWords(body) },
          { term: 'Feed', value: feedWords(body) },
          { term: 'Where from', value: originWords(body) },
        ]}
      />
      <FactRows
        title="Count"
        facts={[
          {
            term: 'Smallest order',
            value: `${printCount(body.minOrder)}, then in steps of ${printCount(body.orderStep)}${largest}`,
          },
          { term: 'Count method', value: countMethodWords(body) },
          { term: 'Overcount', value: overcountWords(body) },
        ]}
      />
      <FactRows
        title="Water they live in"
        facts={[
          { term: 'Temperature', value: printBothTemperatures(water.temperatureC, units) },
          { term: 'pH', value: String(water.pH) },
          { term: 'Hardness (GH)', value: `${printCount(water.ghPpm)} ppm: dissolved minerals` },
          { term: 'Hardness (KH)', value: `${printCount(water.khPpm)} ppm: what keeps the pH from swinging` },
          { term: 'Salt', value: water.saltPpt > 0 ? `${water.saltPpt} ppt` : 'None' },
          { term: 'Source', value: waterSourceWords(body) },
          { term: 'Measured', value: plainDay(water.measuredOn) },
        ]}
      />
      <FactRows
        title="Health"
        facts={[
          { term: 'Treated, last 30 days', value: health.treatments },
          { term: 'Last losses', value: health.lastLosses },
          { term: 'Health papers', value: health.papers ?? 'None given' },
          { term: 'One species only', value: 'The grower has checked the batch for strays.' },
          { term: 'Licences', value: body.licenceNumbers },
        ]}
      />
    </>
  )
}
