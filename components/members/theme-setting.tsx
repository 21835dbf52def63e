import { RadioGroup } from '@/components/ui/radio-group'
import { useChangeMe, useMe } from '@/hooks/use-me'
import { useTheme } from '@/hooks/use-theme'

const choices = [
  { value: 'system', label: 'As my device' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
] as const

/** Takes effect on this device at once; a member's choice is kept with the account too. */
export function ThemeSetting() {
  const { choice, choose } = useTheme()
  const { me } = useMe()
  const change = useChangeMe()
  return (
    <RadioGroup
      label="Light or dark"
      value={choice}
      choices={choices}
      onChange={(theme) => {
        choose(theme)
        if (me) change.mutate({ theme })
      }}
    />
  )
}
