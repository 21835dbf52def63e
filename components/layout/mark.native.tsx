import Svg, { Circle, Path } from 'react-native-svg'

import { color } from '@/constants/theme'

export function Mark({ sizePx }: { sizePx: number }) {
  return (
    <Svg width={sizePx} height={sizePx} viewBox="6 6 52 52" aria-hidden>
      <Path d="M20 6h34a4 4 0 0 1 4 4v44a4 4 0 0 1-4 4H10a4 4 0 0 1-4-4V20z" fill="#2a3579" />
      <Circle cx={21} cy={21} r={5} fill={color.mist} />
      <Path d="M14 41c5.5-9 17-11.5 25-3l9-6v18l-9-6c-8 8.5-19.5 6-25-3z" fill={color.algae} />
      <Circle cx={23} cy={39} r={2} fill={color.onAlgae} />
    </Svg>
  )
}
