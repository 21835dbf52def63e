import { useEffect } from 'react'

import { chooseTheme } from '@/hooks/theme-choice'
import { useMe } from '@/hooks/use-me'

/** Light or dark as kept with the account: chosen on one device, it holds on the others from their next look on. */
export function useAccountTheme(): void {
  const theme = useMe().me?.theme
  useEffect(() => {
    if (theme) chooseTheme(theme)
  }, [theme])
}
