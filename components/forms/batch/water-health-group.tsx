import { useWatch } from 'react-hook-form'

import { BoundArea } from '@/components/forms/bound/bound-area'
import { BoundCheck } from '@/components/forms/bound/bound-check'
import { BoundChoice } from '@/components/forms/bound/bound-choice'
import { BoundDay } from '@/components/forms/bound/bound-day'
import { BoundText } from '@/components/forms/bound/bound-text'
import { FieldCell, FieldRow, FormGroup } from '@/components/forms/form-group'

import type { BatchTyping } from './batch-typing'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Props {
  units: UnitSystem
  today: string
}

const sources = [
  { value: 'well', label: 'Well' },
  { value: 'town', label: 'Town water, dechlorinated' },
  { value: 'rain', label: 'Rain' },
  { value: 'spring', label: 'Spring' },
  { value: 'pond', label: 'Pond' },
]

export function WaterHealthGroup({ units, today }: Props) {
  const onPellets = useWatch<BatchTyping, 'feed.onPellets'>({ name: 'feed.onPellets' })
  return (
    <FormGroup
      groupId="water-health"
      title="Water and health"
      intro="Measured in the tank they are in, within the last 14 days. Buyers match their own water to it."
    >
      <FieldRow>
        <FieldCell>
          <BoundText<BatchTyping>
            name="water.temperatureC"
            label="Temperature"
            placeholder={units === 'us' ? '72 F' : '22 C'}
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping> name="water.pH" label="pH" placeholder="7.4" isFigure />
        </FieldCell>
      </FieldRow>
      <FieldRow>
        <FieldCell>
          <BoundText<BatchTyping>
            name="water.ghPpm"
            label="General hardness"
            placeholder="180"
            suffix="ppm"
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping>
            name="water.khPpm"
            label="Carbonate hardness"
            placeholder="120"
            suffix="ppm"
            isFigure
          />
        </FieldCell>
        <FieldCell>
          <BoundText<BatchTyping> name="water.saltPpt" label="Salt" suffix="ppt" isFigure />
        </FieldCell>
      </FieldRow>
      <FieldRow>
        <FieldCell>
          <BoundChoice<BatchTyping>
            name="water.source"
            label="Water from"
            choices={sources}
            isFolded
            emptyLabel="Choose"
          />
        </FieldCell>
        <FieldCell>
          <BoundDay<BatchTyping>
            name="water.measuredOn"
            label="Measured on"
            quickDay={{ answer: 'Today', day: today }}
          />
        </FieldCell>
      </FieldRow>
      <BoundCheck<BatchTyping> name="feed.onPellets" label="They eat pellets" />
      <FieldRow>
        <FieldCell minPx={240}>
          <BoundText<BatchTyping>
            name="feed.words"
            label={onPellets ? 'Which pellets' : 'What they eat'}
            placeholder={onPellets ? '1 mm floating, 45 % protein' : 'Live brine shrimp'}
            isOptional
            maxLength={160}
          />
        </FieldCell>
        {onPellets ? (
          <FieldCell>
            <BoundDay<BatchTyping> name="feed.since" label="On pellets since" isOptional />
          </FieldCell>
        ) : null}
      </FieldRow>
      <BoundArea<BatchTyping>
        name="health.treatments"
        label="Treatments in the last 30 days"
        hint="What, how much, when."
        rows={2}
        maxLength={400}
        quickAnswer="None"
      />
      <BoundArea<BatchTyping>
        name="health.lastLosses"
        label="Last losses"
        hint="When did you last lose fish from this batch, and how many?"
        rows={2}
        maxLength={400}
        quickAnswer="None"
      />
      <BoundArea<BatchTyping>
        name="health.papers"
        label="Health papers"
        hint="Inspection or certificate numbers and their dates."
        isOptional
        rows={2}
        maxLength={400}
      />
    </FormGroup>
  )
}
