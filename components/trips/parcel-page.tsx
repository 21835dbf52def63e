import { useDeferredValue, useState } from 'react'

import { parcelAsks } from './parcel-asks'
import { ParcelAnswer } from './parcel-answer'
import type { Parcel } from './parcel-of'

import { readAsks, type Typed } from '@/components/tools/read-asks'
import { ToolFields } from '@/components/tools/tool-fields'
import { ToolResult } from '@/components/tools/tool-result'
import { ToolSources } from '@/components/tools/tool-sources'
import { useUnits } from '@/hooks/use-units'
import { bagChemistryEquation } from '@/shared/domain/transport/bag-equations.facts'
import { boxEquation } from '@/shared/domain/transport/box'
import { oxygenDemandEquation } from '@/shared/domain/animals/oxygen-demand'

/** Whether animals survive a parcel, and the cheapest packing with which they do. */
export function ParcelPage() {
  const units = useUnits()
  const [typed, setTyped] = useState<Typed>({})
  const { given, faults } = readAsks(parcelAsks, typed, units)
  const isWhole = Object.keys(faults).length === 0
  // A new plan is searched for behind the typing, never before it.
  const parcel = useDeferredValue(
    isWhole ? JSON.stringify({ ...given.figures, species: given.chosen.species }) : '',
  )
  return (
    <>
      <ToolFields tool={parcelAsks} typed={typed} faults={faults} onTyped={setTyped} />
      {parcel === '' ? <ToolResult answer={null} /> : <ParcelAnswer parcel={JSON.parse(parcel) as Parcel} />}
      <ToolSources equations={[oxygenDemandEquation, bagChemistryEquation, boxEquation]} />
    </>
  )
}
