import { Card } from '@/components/ui/card'
import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { Select } from '@/components/ui/select'
import { useUnits } from '@/hooks/use-units'

import type { Typed } from './read-asks'
import type { Choosing, Tool } from './tool'

const MOST_RADIOS = 3

interface Props {
  tool: Pick<Tool, 'asks' | 'choosing'>
  typed: Typed
  faults: Record<string, string>
  onTyped: (typed: Typed) => void
}

/** The questions of a calculator, each with an example in it from the start. */
export function ToolFields({ tool, typed, faults, onTyped }: Props) {
  const units = useUnits()
  const put = (id: string) => (text: string) => onTyped({ ...typed, [id]: text })
  return (
    <Card>
      {(tool.choosing ?? []).map((choosing) => (
        <Chooser
          key={choosing.id}
          choosing={choosing}
          value={typed[choosing.id] ?? choosing.start}
          onChange={put(choosing.id)}
        />
      ))}
      {tool.asks.map(({ id, label, hint, start, suffix }) => (
        <NumberField
          key={id}
          label={label}
          hint={hint}
          suffix={suffix?.[units]}
          value={typed[id] ?? start[units]}
          onChangeText={put(id)}
          error={faults[id]}
        />
      ))}
    </Card>
  )
}

interface ChooserProps {
  choosing: Choosing
  value: string
  onChange: (value: string) => void
}

function Chooser({ choosing: { label, choices }, ...bound }: ChooserProps) {
  const Control = choices.length <= MOST_RADIOS ? RadioGroup : Select
  return <Control label={label} choices={choices} {...bound} />
}
