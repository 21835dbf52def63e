import { useWindowDimensions } from 'react-native'

import { breakpointOf, type Breakpoint } from '@/constants/theme'

export function useBreakpoint(): Breakpoint {
  return breakpointOf(useWindowDimensions().width)
}
