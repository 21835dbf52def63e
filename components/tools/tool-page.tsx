import { useState } from 'react'

import { readAsks, type Typed } from './read-asks'
import { ToolResult } from './tool-result'
import { ToolSources } from './tool-sources'

import { TwoColumns } from '@/components/layout/two-columns'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { Select } from '@/components/ui/select'
import { Text } from '@/components/ui/text'
import { useUnits } from '@/hooks/use-units'

import type { Choosing, Tool } from './tool'

const MOST_RADIOS = 3

/** One calculator: it answers while one types, and says where the answer comes from. */
export function ToolPage({ tool }: { tool: Tool }) {
  const units = useUnits()
  const [typed, setTyped] = useState<Typed>({})
  const put = (id: string) => (text: string) => setTyped((before) => ({ ...before, [id]: text }))
  const { given, faults } = readAsks(tool, typed, units)
  return (
    <>
      <Text tint="muted">{tool.lead}</Text>
      <TwoColumns
        sideLabel="Answer"
        main={
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
        }
        side={<ToolResult answer={Object.keys(faults).length > 0 ? null : tool.answer(given)} />}
      />
      <Card>
        <Heading level={2} size="lead">
          Please mind
        </Heading>
        {tool.cautions.map((caution) => (
          <Text key={caution}>{caution}</Text>
        ))}
        <Text tint="muted">Not legal, veterinary or food-safety advice.</Text>
      </Card>
      <ToolSources equations={tool.equations} />
    </>
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
