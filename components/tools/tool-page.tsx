import { useState } from 'react'

import { readAsks, type Typed } from './read-asks'
import { ToolFields } from './tool-fields'
import { ToolResult } from './tool-result'
import { ToolSources } from './tool-sources'

import { TwoColumns } from '@/components/layout/two-columns'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { useUnits } from '@/hooks/use-units'

import type { Tool } from './tool'

/** One calculator: it answers while one types, and says where the answer comes from. */
export function ToolPage({ tool }: { tool: Tool }) {
  const units = useUnits()
  const [typed, setTyped] = useState<Typed>({})
  const { given, faults } = readAsks(tool, typed, units)
  return (
    <>
      <Text tint="muted">{tool.lead}</Text>
      <TwoColumns
        sideLabel="Answer"
        main={<ToolFields tool={tool} typed={typed} faults={faults} onTyped={setTyped} />}
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
