import { RadioGroup } from '@/components/ui/radio-group'
import { useToast } from '@/components/ui/toast'
import { useChangeMe } from '@/hooks/use-me'
import type { Me } from '@/shared/contracts/members'

const choices = [
  { value: 'us', label: 'US', hint: 'Inches, pounds, gallons, miles, °F' },
  { value: 'metric', label: 'Metric', hint: 'Centimetres, grams, litres, kilometres, °C' },
] as const

export function UnitsSetting({ units }: { units: Me['units'] }) {
  const change = useChangeMe()
  const toast = useToast()
  return (
    <RadioGroup
      label="Units"
      hint="Figures that decide whether animals live are always shown in both."
      value={change.isPending ? (change.variables.units ?? units) : units}
      choices={choices}
      onChange={(chosen) =>
        change.mutate(
          { units: chosen },
          { onError: ({ message }) => toast({ text: message, tone: 'danger' }) },
        )
      }
    />
  )
}
