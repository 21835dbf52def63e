import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { Checkbox } from '@/components/ui/checkbox'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import type { GateVerdict } from '@/shared/contracts/rules'

interface Props {
  gate: GateVerdict
  ticked: readonly string[]
  onChange: (ticked: readonly string[]) => void
  errorAt: (fieldId: string) => string | undefined
}

/** What the buyer reads and ticks before paying; kept with the order as it was shown. */
export function GateStatements({ gate, ticked, onChange, errorAt }: Props) {
  const toggle = (id: string, isOn: boolean) =>
    onChange(isOn ? [...ticked, id] : ticked.filter((one) => one !== id))
  // What is ticked already is not said a second time below.
  const cautions = gate.cautions.filter(({ text }) => !gate.ticks.some((tick) => tick.text === text))
  return (
    <Card labelledBy="statements">
      <Heading level={2} size="lead" nativeID="statements">
        Before you pay
      </Heading>
      {gate.demonstration ? (
        <Banner tone="caution" title="Demonstration rules">
          <Text>These rules are made up for the demonstration. They are not a reading of any law.</Text>
        </Banner>
      ) : null}
      {gate.ticks.map((tick) => (
        <Checkbox
          key={tick.id}
          label={tick.text}
          fieldId={`tick-${tick.id}`}
          isChecked={ticked.includes(tick.id)}
          onChange={(isOn) => toggle(tick.id, isOn)}
          error={errorAt(`tick-${tick.id}`)}
        />
      ))}
      {gate.papersNeeded.map((paper) => (
        <Text key={paper}>{`Paper needed before the animals leave: ${paper}`}</Text>
      ))}
      {cautions.map((caution) => (
        <Text key={caution.id} size="note" tint="muted">
          {caution.text}
        </Text>
      ))}
    </Card>
  )
}
