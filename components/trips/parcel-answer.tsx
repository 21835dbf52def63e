import { useMutation } from '@tanstack/react-query'
import { useMemo, useState } from 'react'
import { View } from 'react-native'

import { sheetAskOf, taskOf, type Parcel } from './parcel-of'
import { planLines } from './plan-words'
import { saveFile } from './save-file'
import { TripLine } from './trip-line'
import { TripTable } from './trip-table'
import { TripVerdict } from './trip-verdict'

import { ToolResult } from '@/components/tools/tool-result'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { call } from '@/hooks/api'
import { useUnits } from '@/hooks/use-units'
import { planPacking, type PackingPlan, type PackingTask } from '@/shared/domain/transport/plan-packing'
import { printBothTemperatures } from '@/shared/units/temperature'

/** The plan, what speaks for and against it, its way in the cold, and its sheet to print. */
export function ParcelAnswer({ parcel }: { parcel: Parcel }) {
  const task = useMemo(() => taskOf(parcel), [parcel])
  const found = useMemo(() => (task ? planPacking(task) : null), [task])
  if (!task || !found) {
    return <ToolResult answer={{ refusal: 'No figures are published for this animal at this length.' }} />
  }
  if (!found.plan) return <TripVerdict answer={{ verdict: 'unsafe', reasons: found.because }} />
  return <Planned parcel={parcel} task={task} plan={found.plan} />
}

function Planned({ parcel, task, plan }: { parcel: Parcel; task: PackingTask; plan: PackingPlan }) {
  const units = useUnits()
  const [isTable, setIsTable] = useState(false)
  const print = useMutation({
    mutationFn: async () => {
      const body = sheetAskOf(parcel)
      if (body) saveFile(await call('makePackingSheet', { body }), sheetFile)
    },
  })
  const { cold } = plan.answer
  const rangeC = task.animals.species.shipWaterC
  const words = cold?.coldest
    ? `In the coldest air the water falls to ${printBothTemperatures(cold.coldest.waterC, units)}.`
    : ''
  return (
    <>
      <ToolResult
        answer={{
          lines: planLines(plan, units),
          note: 'The cheapest packing of the usual sizes that is safe on the cold and on the warm end. Prices are round figures to plan by.',
        }}
      />
      <Card>
        <TripVerdict answer={plan.answer} />
        {cold && rangeC ? (
          <TripLine
            steps={cold.steps}
            rangeC={rangeC}
            departHour={task.departHour}
            units={units}
            label={words}
          />
        ) : null}
        <Button
          kind="quiet"
          icon={isTable ? 'up' : 'down'}
          label={isTable ? 'Hide the figures' : 'Show the figures'}
          isExpanded={isTable}
          onPress={() => setIsTable(!isTable)}
        />
        {isTable && cold ? <TripTable steps={cold.steps} units={units} /> : null}
      </Card>
      <View>
        <Button
          icon="print"
          label="Packing sheet to print (PDF)"
          busyLabel="Making the sheet"
          isBusy={print.isPending}
          onPress={() => print.mutate()}
        />
      </View>
      {print.error ? (
        <Banner tone="danger" title="The sheet was not made" isLive>
          {print.error.message}
        </Banner>
      ) : null}
    </>
  )
}

const sheetFile = { name: 'packing-sheet.pdf', type: 'application/pdf' }
